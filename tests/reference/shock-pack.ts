export { cases }

import { laminarPressure, orificePressure } from '#shared/calculators/shock-pack/piston.ts'
import { calculator } from '#shared/calculators/shock-pack/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const pipe = (diameter: number, length: number) => ({
  count: 1,
  diameter: diameter * 1000,
  length: length * 1000,
})
const fossee = 'in the public Python companion notebooks of FOSSEE'
const lastDigit = 'half a unit of the last printed digit'
const base = { calculator: 'shock-pack' } as const

const thin = {
  holes: 6,
  holeDiameter: 1.3,
  pistonThickness: 2.5,
  boreDiameter: 16,
  rodDiameter: 3.5,
  viscosity: 350,
  density: 970,
  shaftSpeed: 100,
}
const thick = { ...thin, holes: 8, holeDiameter: 1.2, viscosity: 500, shaftSpeed: 200 }
const narrow = {
  holes: 2,
  holeDiameter: 1.6,
  pistonThickness: 2,
  boreDiameter: 13,
  rodDiameter: 3,
  viscosity: 400,
  density: 965,
  shaftSpeed: 100,
}
const fluids =
  'Python 3.11 with mpmath 1.3.0; the pressures checked against friction_laminar of the fluids library 1.3.1'
const orificeForce = (inputs: typeof thin) =>
  outputOf(calculator, inputs, 'force') - (outputOf(calculator, inputs, 'damping') * inputs.shaftSpeed) / 1000

/** Pressure over a hole from its velocity profile: wall drag balanced ring by ring, the rings summed up. */
function pressureByRings(dynamicViscosity: number, diameter: number, length: number, flow: number): number {
  const rings = 20_000
  const step = diameter / 2 / rings
  let speed = 0
  let flowPerPressure = 0
  for (let ring = rings - 1; ring >= 0; ring -= 1) {
    const middle = (ring + 0.5) * step
    // Drag on the cylinder of this radius carries the pressure on its end: du/dr = −Δp r/(2 μ L).
    const gain = (middle * step) / (2 * dynamicViscosity * length)
    flowPerPressure += 2 * Math.PI * middle * step * (speed + gain / 2)
    speed += gain
  }
  return flow / flowPerPressure
}

const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'flow of glycerol (1.2 Pa·s) through a pipe of 126 mm, 60 m long, under 90 kPa',
    source: `C. Schaschke, fluid mechanics worked examples, example 3.4 (page 67), ${fossee}: 0.0077 m³/s`,
    evidence: 'read in a transcription',
    unit: 'm³/s',
    expected: 0.0077,
    tolerance: 5e-5,
    toleranceReason: lastDigit,
    got: () => 90_000 / laminarPressure(pipe(0.126, 60), 1.2, 1),
  },
  {
    ...base,
    what: 'pressure for 1.8 litres a minute of glycerol (0.9 Pa·s) through 10 mm, 6.5 m long',
    source: `J. F. Douglas and others, Fluid Mechanics, example 10.2 (page 335), ${fossee}: 715 kN/m²`,
    evidence: 'read in a transcription',
    unit: 'kPa',
    expected: 715,
    tolerance: 0.5,
    toleranceReason: lastDigit,
    got: () => laminarPressure(pipe(0.01, 6.5), 0.9, 3e-5) / 1000,
  },
  {
    ...base,
    what: 'pressure for glycerine (0.3073 Pa·s) at 3 m/s through 40 mm, 70 m long',
    source: `Y. Çengel and J. Cimbala, Fluid Mechanics, example 8-1 (page 349), ${fossee}: 1291 kPa`,
    evidence: 'read in a transcription',
    unit: 'kPa',
    expected: 1291,
    tolerance: 0.5,
    toleranceReason: lastDigit,
    got: () => laminarPressure(pipe(0.04, 70), 0.3073, (3 * Math.PI * 0.04 ** 2) / 4) / 1000,
  },
  {
    ...base,
    what: 'pressure for water (1.519 mPa·s) at 0.9 m/s through 3 mm, 9 m long',
    source: `Y. Çengel and J. Cimbala, Fluid Mechanics, example 8-2 (page 350), ${fossee}: 43.7 kPa`,
    evidence: 'read in a transcription',
    unit: 'kPa',
    expected: 43.7,
    tolerance: 0.05,
    toleranceReason: lastDigit,
    got: () => laminarPressure(pipe(0.003, 9), 1.519e-3, (0.9 * Math.PI * 0.003 ** 2) / 4) / 1000,
  },
  {
    ...base,
    what: 'pressure that drives 252 US gallons a minute of oil (0.9) through an orifice of 1 in with coefficient 0.80',
    source: `A. Esposito, Fluid Power with Applications, example 8.4 (page 302), ${fossee}: 100 psi`,
    evidence: 'read in a transcription',
    unit: 'psi',
    expected: 100,
    tolerance: 1,
    toleranceReason:
      'the flow is printed with three digits and its constant 38.1 is rounded; pressure takes both twice',
    got: () =>
      orificePressure({ count: 1, diameter: 25.4, length: 1 }, 900, (252 * 3.785411784e-3) / 60, 0.8) /
      6894.757293168361,
  },
  ...(
    [
      ['6 × 1.3 mm in 350 cSt', thin, 'damping', 'N·s/m', 73.957843, 5e-7],
      ['6 × 1.3 mm in 350 cSt at 100 mm/s', thin, 'reynolds', '1', 8.928571, 5e-7],
      ['8 × 1.2 mm in 500 cSt', thick, 'damping', 'N·s/m', 109.142999, 5e-7],
      ['8 × 1.2 mm in 500 cSt at 200 mm/s', thick, 'reynolds', '1', 10.15625, 5e-9],
      ['2 × 1.6 mm in 400 cSt, bore 13 mm', narrow, 'damping', 'N·s/m', 37.895461, 5e-7],
      ['2 × 1.6 mm in 400 cSt at 100 mm/s, bore 13 mm', narrow, 'reynolds', '1', 12.5, 1e-9],
    ] as const
  ).map(([what, inputs, key, unit, expected, tolerance]): ReferenceCase => ({
    ...base,
    what: `${key} of ${what}`,
    source: fluids,
    evidence: 'computed independently',
    unit,
    expected,
    tolerance,
    toleranceReason: 'half a unit of the last digit given',
    got: () => outputOf(calculator, inputs, key),
  })),
  ...(
    [
      [thin, 1.395745],
      [thick, 4.325508],
      [narrow, 1.540366],
    ] as const
  ).map(([inputs, expected]): ReferenceCase => ({
    ...base,
    what: `orifice part of the force of ${inputs.holes} × ${inputs.holeDiameter} mm at ${inputs.shaftSpeed} mm/s`,
    source: 'Python 3.11 with mpmath 1.3.0 for a discharge coefficient of 0.62, times (0.62/0.61)²',
    evidence: 'computed independently',
    unit: 'N',
    ...relative(expected * (0.62 / 0.61) ** 2, 1e-6),
    toleranceReason: 'given with seven digits',
    got: () => orificeForce(inputs),
  })),
  {
    ...base,
    what: 'damping of the default piston in 350 cSt, from the layers of oil in its holes',
    source:
      'Wall drag balanced ring by ring and summed over 20,000 rings at test time, without the fourth-power law',
    evidence: 'computed independently',
    unit: 'N·s/m',
    ...relative((pressureByRings(0.3395, 1.3e-3, 2.5e-3, (191.4408e-6 * 0.1) / 6) * 191.4408e-6) / 0.1, 1e-6),
    toleranceReason: 'the area is given with seven digits and enters squared',
    got: () => outputOf(calculator, thin, 'damping'),
  },
]
