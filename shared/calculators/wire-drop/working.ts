export { wireWorking }

import { fenced, frac, math, num, power, row, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'gauge' | 'length' | 'current' | 'temperature', number>
type Outputs = Record<'diameter' | 'resistance' | 'voltageDrop' | 'heat', number>

const gaugeLaw = (gauge: MathPart) => row('0.127', '×', power('92', frac(row(36, '−', gauge), 39)))
const ohms = (temperature: MathPart, length: MathPart, diameter: MathPart) =>
  frac(
    row('0.017241', '×', fenced('1', '+', '0.00393', '×', fenced(temperature, '−', 20)), '×', 2, '×', length),
    row('π', '×', power(diameter, '2'), '/', 4),
  )

function wireWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { gauge, length, current, temperature } = inputs
  const [amperes, resistance] = [num(current, 6), num(outputs.resistance / 1000, 5)]
  return {
    symbols: [
      { symbol: math('n'), means: say`wire gauge, ${figure(gauge, 'AWG')}` },
      { symbol: math('d'), means: say`diameter of the copper, as one solid wire` },
      { symbol: math('l'), means: say`length of one lead, ${figure(length, 'mm', 6)}; there are two` },
      { symbol: math('T'), means: say`temperature of the copper in °C, ${figure(temperature, '°C', 6)}` },
      { symbol: math('I'), means: say`current, ${figure(current, 'A', 6)}` },
    ],
    steps: [
      {
        title: 'Diameter of the copper in mm',
        formula: math('d', '=', gaugeLaw('n')),
        numbers: math('d', '=', gaugeLaw(num(gauge))),
        result: figure(outputs.diameter, 'mm', 5),
      },
      {
        title:
          'Resistance of both leads in mΩ, with lengths in mm; 0.017241 Ω of copper for 1 m of 1 mm² is as much in mΩ for 1 mm',
        formula: math('R', '=', ohms('T', 'l', 'd')),
        numbers: math('R', '=', ohms(num(temperature, 6), num(length, 6), num(outputs.diameter, 5))),
        result: figure(outputs.resistance, 'mΩ', 4),
      },
      {
        title: 'Voltage lost, with R in Ω',
        formula: math('U', '=', 'I', '×', 'R'),
        numbers: math('U', '=', amperes, '×', resistance),
        result: figure(outputs.voltageDrop, 'V', 4),
      },
      {
        title: 'Heat in both leads',
        formula: math('P', '=', power('I', '2'), '×', 'R'),
        numbers: math('P', '=', power(amperes, '2'), '×', resistance),
        result: figure(outputs.heat, 'W', 4),
      },
    ],
  }
}
