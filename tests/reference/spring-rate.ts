export { cases }

import { add, cross, dot, multiply, norm, unit, type Unit } from 'mathjs'
import { coilSpring } from '#shared/calculators/spring-rate/coil-spring.ts'
import { calculator } from '#shared/calculators/spring-rate/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const rate =
  (wireDiameter: number, meanDiameter: number, activeCoils: number, shearModulus: number, key = 'rate') =>
  () =>
    outputOf(
      calculator,
      { wireDiameter, outsideDiameter: meanDiameter + wireDiameter, activeCoils, shearModulus },
      key,
    )

/**
 * The same spring as a curved bar in space: a force along the axis of a helix, its moment about every piece of
 * wire split into twist and bending, and their strain energies added up. N/mm.
 */
function rateByEnergy(
  wire: number,
  mean: number,
  coils: number,
  shear: number,
  young: number,
  pitch: number,
): number {
  const radius = mean / 2
  const turns = 2000
  const rise = pitch / (2 * Math.PI)
  const length = Math.hypot(radius, rise)
  const step = (2 * Math.PI * coils) / turns
  const [polar, second] = [(Math.PI * wire ** 4) / 32, (Math.PI * wire ** 4) / 64]
  let compliance = 0
  for (let index = 0; index < turns; index += 1) {
    const angle = (index + 0.5) * step
    const place = [radius * Math.cos(angle), radius * Math.sin(angle), 0]
    const along = multiply(
      [-radius * Math.sin(angle), radius * Math.cos(angle), rise],
      1 / length,
    ) as number[]
    const moment = cross(place, [0, 0, 1]) as number[]
    const twist = dot(moment, along)
    const bending = norm(add(moment, multiply(along, -twist)) as number[]) as number
    compliance += (twist ** 2 / (shear * polar) + bending ** 2 / (young * second)) * length * step
  }
  return 1 / compliance
}

const barton =
  'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, page 213 (fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/224)'
const lastDigit = 'half a unit of the last printed digit'
const base = { calculator: 'spring-rate', unit: 'N/mm' } as const

const cases: readonly ReferenceCase[] = [
  ...(
    [
      ['front', 120, 7.73, 19.3],
      ['rear', 100, 6.1, 42.3],
    ] as const
  ).map(([end, mean, coils, expected]): ReferenceCase => ({
    ...base,
    what: `${end} spring of a road car: wire 12.7 mm, mean diameter ${mean} mm, ${coils} coils`,
    source: `${barton}: it asks for ${expected} N/mm and finds ${coils} coils`,
    evidence: 'read',
    ...relative(expected, 1e-3),
    toleranceReason:
      'the coils are printed with three digits, half a unit of which is 0.07 to 0.08 % of the rate',
    got: () =>
      coilSpring({ wireDiameter: 12.7, outsideDiameter: mean + 12.7, activeCoils: coils, shearModulus: 79.3 })
        .rate,
  })),
  {
    ...base,
    what: 'wire 3 mm, mean diameter 18 mm, 15 coils, G 84 GPa',
    source:
      'Sadhu Singh, machine design textbook, example 8.3 (page 229), in the public Python companion notebooks of FOSSEE',
    evidence: 'read in a transcription',
    expected: 9.72,
    tolerance: 0.005,
    toleranceReason: lastDigit,
    got: rate(3, 18, 15, 84),
  },
  {
    ...base,
    what: 'wire 7 mm, mean diameter 42 mm, 8 coils, G 81.37 GPa',
    source:
      'V. B. Bhandari, Design of Machine Elements, example 10.1, in the public Scilab companion of FOSSEE: 1,250 N shorten it by 30.337611 mm',
    evidence: 'read in a transcription',
    ...relative(1250 / 30.337611, 1e-7),
    toleranceReason: 'the movement is printed with eight digits',
    got: rate(7, 42, 8, 81.37),
  },
  {
    ...base,
    unit: 'lbf/in',
    what: 'music wire 0.037 in, mean diameter 0.400 in, 10.5 working coils, G 11.85 million psi',
    source: 'J. E. Shigley, Mechanical Engineering Design, example 10-1: 4.13 lbf/in',
    evidence: 'from memory',
    expected: 4.13,
    tolerance: 0.005,
    toleranceReason: lastDigit,
    got: rate(0.037 * 25.4, 0.4 * 25.4, 10.5, 11.85 * 6.894757293168361, 'rateLbfPerIn'),
  },
  {
    ...base,
    what: 'wire 1.4 mm, mean diameter 16 mm, 7 coils, G 81.7 GPa',
    source: 'The formula evaluated with mpmath 1.3.0 at 30 digits',
    evidence: 'computed independently',
    expected: 1.368315,
    tolerance: 5e-7,
    toleranceReason: lastDigit,
    got: rate(1.4, 16, 7, 81.7),
  },
  {
    ...base,
    unit: 'gf/mm',
    what: 'the same spring in gram-force per millimetre',
    source: 'Units by SciPy’s table of constants (1 kgf = 9.80665 N), after mpmath 1.3.0',
    evidence: 'computed independently',
    expected: 139.5293,
    tolerance: 5e-5,
    toleranceReason: lastDigit,
    got: rate(1.4, 16, 7, 81.7, 'rateGfPerMm'),
  },
  {
    ...base,
    unit: 'lbf/in',
    what: 'the default spring, converted',
    source: 'mathjs 15.2.0: its own units turn N/mm into lbf/in',
    evidence: 'computed independently',
    ...relative((unit(rate(1.6, 21.4, 7.5, 79.3)(), 'N/mm') as Unit).toNumber('lbf/in'), 1e-12),
    toleranceReason: 'both hold the exact definitions of inch and pound; only rounding of doubles is left',
    got: rate(1.6, 21.4, 7.5, 79.3, 'rateLbfPerIn'),
  },
  {
    ...base,
    what: 'the default spring as a curved bar in space',
    source:
      'Strain energy of twist and bending added up along the helix (pitch 4 mm) with the vectors of mathjs 15.2.0',
    evidence: 'computed independently',
    ...relative(rateByEnergy(1.6, 21.4, 7.5, 79300, 207000, 4), 2e-3),
    toleranceReason: 'the formula takes the coils as flat rings; their slope of 3.4° is worth 0.1 %',
    got: rate(1.6, 21.4, 7.5, 79.3),
  },
]
