export { cases }

import { all, create, type Matrix } from 'mathjs'
import { calculator } from '#shared/calculators/wheelbase-shims/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>, key: string) => () => outputOf(calculator, inputs, key)

/** Front share in per cent of a car whose centre of gravity is `behindFront` mm behind the front axle. */
function frontShare(wheelbase: number, behindFront: number): number {
  const loads = mathjs.lusolve(
    mathjs.matrix([
      [1, 1],
      [0, wheelbase],
    ]),
    mathjs.matrix([100, 100 * behindFront]),
  ) as Matrix
  return (loads.toArray() as number[][])[0]?.[0] ?? NaN
}

const base = { calculator: 'wheelbase-shims', unit: '%' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      [325, 48, 2],
      [325, 48, -3],
      [257, 41.5, 4.5],
      [560, 62, -12],
    ] as const
  ).map(([wheelbase, frontWeight, rearAxleBack]): ReferenceCase => ({
    ...base,
    what: `${frontWeight} % in front on ${wheelbase} mm, axle back ${rearAxleBack} mm: new front share`,
    source:
      'Both axle loads solved from force and moment balance with mathjs 15 (lusolve), the centre of gravity fixed to the chassis',
    evidence: 'computed independently',
    ...relative(frontShare(wheelbase + rearAxleBack, wheelbase * (1 - frontWeight / 100)), 1e-12),
    toleranceReason: 'rounding of double precision',
    got: got({ wheelbase, frontWeight, rearAxleBack }, 'newFrontWeight'),
  })),
  {
    ...base,
    what: 'car with its axles 2.4 m apart and 4,500 of 8,000 N in front, from axles 2.35 m apart (a tenth of the size, axle moved 5 mm)',
    source:
      'Worked school problem, asklearnings.org/asktema/6436263: 4,500 N of 8,000 N in front, centre of gravity 1.05 m behind the front axle',
    evidence: 'read',
    ...relative(56.25, 1e-9),
    toleranceReason: 'the printed loads are exact: 4,500/8,000',
    // The same centre of gravity, 105 mm behind the front axle, on the shorter wheelbase of 235 mm.
    got: got({ wheelbase: 235, frontWeight: 100 * (1 - 105 / 235), rearAxleBack: 5 }, 'newFrontWeight'),
  },
  {
    ...base,
    what: 'car of 1,800 kg with its axles 1.8 m apart, 1.05 m from the front axle, from axles 1.9 m apart (a tenth of the size, axle moved −10 mm)',
    source:
      'Worked school problem, ask.learncbse.in/t/a-car-of-weight-1800-kg/13959: 375 kg on each front and 525 kg on each rear wheel',
    evidence: 'read',
    ...relative((100 * 750) / 1800, 1e-9),
    toleranceReason: 'the printed loads are exact: 750 of 1,800 kg in front',
    got: got({ wheelbase: 190, frontWeight: 100 * (1 - 105 / 190), rearAxleBack: -10 }, 'newFrontWeight'),
  },
]
