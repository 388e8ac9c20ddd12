export { packWorking }

import { frac, math, num, row, sub } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { cellVoltage } from './pack.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'capacity' | 'usableShare' | 'averageCurrent' | 'cells' | 'chargeRate', number>
type Outputs = Record<
  'runTime' | 'energy' | 'power' | 'dischargeRate' | 'chargeCurrent' | 'chargeTime',
  number
>

const voltage = sub('V', 'cell')
const charging = sub('I', 'charge')

function packWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { capacity, usableShare, averageCurrent, cells, chargeRate } = inputs
  const [ampereHours, current] = [num(capacity / 1000, 6), num(averageCurrent, 6)]
  return {
    symbols: [
      {
        symbol: math('Q'),
        means: say`capacity in ampere-hours: ${figure(capacity, 'mAh', 6)} is ${figure(capacity / 1000, '1', 6)}\u00A0Ah`,
      },
      { symbol: math('u'), means: say`share of it that you drive, ${figure(usableShare, '%', 6)}` },
      { symbol: math('I'), means: say`average current, ${figure(averageCurrent, 'A', 6)}` },
      { symbol: math('S'), means: say`cells in a row, ${figure(cells, '1')}` },
      { symbol: math(voltage), means: say`nominal voltage of a cell, ${figure(cellVoltage, 'V')}` },
      { symbol: math('c'), means: say`charge rate, ${figure(chargeRate, 'C', 6)}` },
    ],
    steps: [
      {
        title: 'Run time in minutes',
        formula: math('t', '=', 60, '×', frac(row('Q', '×', 'u'), 'I')),
        numbers: math('t', '=', 60, '×', frac(row(ampereHours, '×', num(usableShare / 100, 6)), current)),
        result: figure(outputs.runTime, 'min', 4),
      },
      {
        title: 'Energy in the whole pack',
        formula: math('E', '=', 'Q', '×', 'S', '×', voltage),
        numbers: math('E', '=', ampereHours, '×', num(cells), '×', cellVoltage),
        result: figure(outputs.energy, 'Wh', 4),
      },
      {
        title: 'Power on average',
        formula: math('P', '=', 'I', '×', 'S', '×', voltage),
        numbers: math('P', '=', current, '×', num(cells), '×', cellVoltage),
        result: figure(outputs.power, 'W', 4),
      },
      {
        title: 'How hard the pack is used',
        formula: math('r', '=', frac('I', 'Q')),
        numbers: math('r', '=', frac(current, ampereHours)),
        result: figure(outputs.dischargeRate, 'C', 4),
      },
      {
        title: 'Charge current to set',
        formula: math(charging, '=', 'c', '×', 'Q'),
        numbers: math(charging, '=', num(chargeRate, 6), '×', ampereHours),
        result: figure(outputs.chargeCurrent, 'A', 4),
      },
      {
        title: 'Charge time for the whole capacity at that current, in minutes',
        formula: math(sub('t', 'charge'), '=', 60, '×', frac('Q', charging), '=', frac(60, 'c')),
        numbers: math(sub('t', 'charge'), '=', frac(60, num(chargeRate, 6))),
        result: figure(outputs.chargeTime, 'min', 4),
      },
    ],
  }
}
