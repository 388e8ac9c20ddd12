export { cases }

import { all, create, type Unit } from 'mathjs'
import { calculator } from '#shared/calculators/run-time/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>, key: string) => () => outputOf(calculator, inputs, key)
const inUnit = (expression: string, unit: string) => (mathjs.evaluate(expression) as Unit).toNumber(unit)

const twoCells = { cells: 2, capacity: 4000 }
const fourCells = { cells: 4, capacity: 5000 }
const list =
  'Charge, energy and C rate of named packs, worked out with Python 3.11 from 3.7 V a cell and 60/C minutes'
const units = 'The quantities themselves, with units, evaluated by mathjs 15'
const exact = 'exact but for rounding of double precision'
const base = { calculator: 'run-time' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      ['2 cells, 4 Ah: energy', twoCells, 'energy', 29.6, 'Wh'],
      [
        '2 cells, 4 Ah, all of it at 25 A',
        { ...twoCells, averageCurrent: 25, usableShare: 100 },
        'runTime',
        9.6,
        'min',
      ],
      [
        '2 cells, 4 Ah, 80 % at 25 A',
        { ...twoCells, averageCurrent: 25, usableShare: 80 },
        'runTime',
        7.68,
        'min',
      ],
      ['2 cells at 25 A: power', { ...twoCells, averageCurrent: 25 }, 'power', 185, 'W'],
      ['2 cells, 4 Ah, at 240 A: C rate', { ...twoCells, averageCurrent: 240 }, 'dischargeRate', 60, 'C'],
      ['4 cells, 5 Ah: energy', fourCells, 'energy', 74, 'Wh'],
      [
        '4 cells, 5 Ah, 80 % at 45 A',
        { ...fourCells, averageCurrent: 45, usableShare: 80 },
        'runTime',
        5.3333,
        'min',
      ],
      ['5 Ah charged at 1C: current', { ...fourCells, chargeRate: 1 }, 'chargeCurrent', 5, 'A'],
      ['5 Ah charged at 1C: ideal time', { ...fourCells, chargeRate: 1 }, 'chargeTime', 60, 'min'],
    ] as const
  ).map(([what, inputs, key, expected, unit]): ReferenceCase => ({
    ...base,
    what,
    source: list,
    evidence: 'computed independently',
    unit,
    expected,
    tolerance: 5e-5,
    toleranceReason: 'half a unit of the last digit given',
    got: got(inputs, key),
  })),
  {
    ...base,
    what: 'one cell of 3.7 V and 6,000 mAh: energy',
    source:
      'Worked example of a dangerous-goods adviser’s pages on watt-hours (wiki.gefahrgutberater.de, “Wattstunden”): 3.7 V × 6 Ah = 22.2 Wh',
    evidence: 'read',
    unit: 'Wh',
    expected: 22.2,
    tolerance: 0.05,
    toleranceReason: 'half a unit of the last printed digit',
    got: got({ cells: 1, capacity: 6000 }, 'energy'),
  },
  {
    ...base,
    what: '3,000 mAh at 0.5 A, all of it',
    source:
      'Worked example of vbatpower.com/formulas/battery-runtime: 3,000 mAh supplying 500 mA run 6 hours in theory',
    evidence: 'read',
    unit: 'min',
    ...relative(360, 1e-9),
    toleranceReason: 'the printed answer is exact',
    got: got({ capacity: 3000, averageCurrent: 0.5, usableShare: 100 }, 'runTime'),
  },
  ...(
    [
      [
        'run time of 80 % of 6,200 mAh at 27 A',
        '0.8 * 6.2 A hour / (27 A)',
        'minute',
        { capacity: 6200, averageCurrent: 27 },
        'runTime',
        'min',
      ],
      [
        'energy of 6,200 mAh in 6 cells, from joules',
        '6.2 A hour * 6 * 3.7 V',
        'W hour',
        { capacity: 6200, cells: 6 },
        'energy',
        'Wh',
      ],
      ['power of 27 A from 6 cells', '27 A * 6 * 3.7 V', 'W', { averageCurrent: 27, cells: 6 }, 'power', 'W'],
      [
        'charge time of 6,200 mAh at 9.3 A (1.5C)',
        '6.2 A hour / (9.3 A)',
        'minute',
        { capacity: 6200, chargeRate: 1.5 },
        'chargeTime',
        'min',
      ],
    ] as const
  ).map(([what, expression, mathUnit, inputs, key, unit]): ReferenceCase => ({
    ...base,
    what,
    source: units,
    evidence: 'computed independently',
    unit,
    ...relative(inUnit(expression, mathUnit), 1e-12),
    toleranceReason: exact,
    got: got(inputs, key),
  })),
]
