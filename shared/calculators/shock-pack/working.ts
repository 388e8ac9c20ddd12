export { packWorking }

import { fenced, frac, math, num, power, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { dischargeCoefficient, shockPack, type PackValues } from './piston.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = PackValues & { newHoles: number; newHoleDiameter: number }
type Outputs = Record<'damping' | 'force' | 'reynolds' | 'newDamping' | 'viscosityToMatch', number>

const dampingOf = (viscosity: MathPart, length: MathPart, area: MathPart, count: MathPart, hole: MathPart) =>
  frac(
    row('128', '×', viscosity, '×', length, '×', power(area, '2')),
    row(count, '×', 'π', '×', power(hole, '4')),
  )
const matchOf = (
  viscosity: MathPart,
  newCount: MathPart,
  newHole: MathPart,
  count: MathPart,
  hole: MathPart,
) => row(viscosity, '×', frac(row(newCount, '×', power(newHole, '4')), row(count, '×', power(hole, '4'))))
const orificeOf = (density: MathPart, area: MathPart, speed: MathPart, count: MathPart, hole: MathPart) =>
  frac(
    row(density, '×', power(area, '3'), '×', power(speed, '2')),
    row(
      '2',
      '×',
      power(fenced(num(dischargeCoefficient), '×', count, '×', 'π', '×', frac(power(hole, '2'), '4')), '2'),
    ),
  )
const fresh = (letter: string) => sub(letter, 'new')

function packWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const {
    holes,
    holeDiameter,
    pistonThickness,
    boreDiameter,
    rodDiameter,
    viscosity,
    density,
    shaftSpeed,
    newHoles,
    newHoleDiameter,
  } = inputs
  const { area, orificeForce } = shockPack(inputs)
  const dynamic = viscosity * 1e-6 * density
  const metres = (millimetres: number) => num(millimetres / 1000, 6)
  return {
    symbols: [
      { symbol: math('n'), means: say`holes, ${String(holes)}; the new piston has ${String(newHoles)}` },
      {
        symbol: math('d'),
        means: say`diameter of a hole, ${figure(holeDiameter, 'mm', 6)}; the new one ${figure(newHoleDiameter, 'mm', 6)}`,
      },
      { symbol: math('L'), means: say`thickness of the piston, ${figure(pistonThickness, 'mm', 6)}` },
      {
        symbol: math('A'),
        means: say`area that pushes the fluid, from bore ${figure(boreDiameter, 'mm', 6)} and rod ${figure(rodDiameter, 'mm', 6)}`,
      },
      { symbol: math('ν'), means: say`thickness of the fluid, ${figure(viscosity, 'cSt', 9)}` },
      { symbol: math('ρ'), means: say`its density, ${figure(density, 'kg/m³', 5)}` },
      { symbol: math('v'), means: say`speed of the shaft, ${figure(shaftSpeed, 'mm/s', 5)}` },
    ],
    steps: [
      {
        title: 'Area that pushes the fluid, in m²',
        formula: math(
          'A',
          '=',
          frac('π', '4'),
          '×',
          fenced(power(sub('D', 'bore'), '2'), '−', power(sub('D', 'rod'), '2')),
        ),
        numbers: math(
          'A',
          '=',
          frac('π', '4'),
          '×',
          fenced(power(metres(boreDiameter), '2'), '−', power(metres(rodDiameter), '2')),
        ),
        result: figure(area, '1', 5),
      },
      {
        title: 'Viscosity in Pa·s: 1 cSt is a millionth of a m²/s',
        formula: math('μ', '=', 'ν', '×', 'ρ'),
        numbers: math('μ', '=', num(viscosity * 1e-6, 6), '×', num(density, 5)),
        result: figure(dynamic, '1', 5),
      },
      {
        title: 'Damping against viscosity alone, lengths in m',
        formula: math('c', '=', dampingOf('μ', 'L', 'A', 'n', 'd')),
        numbers: math(
          'c',
          '=',
          dampingOf(
            num(dynamic, 5),
            metres(pistonThickness),
            num(area, 5),
            num(holes, 6),
            metres(holeDiameter),
          ),
        ),
        result: figure(outputs.damping, 'N·s/m', 4),
      },
      {
        title: 'Force that speeding the fluid up adds at that shaft speed',
        formula: math(sub('F', 'orifice'), '=', orificeOf('ρ', 'A', 'v', 'n', 'd')),
        numbers: math(
          sub('F', 'orifice'),
          '=',
          orificeOf(num(density, 5), num(area, 5), metres(shaftSpeed), num(holes, 6), metres(holeDiameter)),
        ),
        result: figure(orificeForce, 'N', 4),
      },
      {
        title: 'Force at that shaft speed',
        formula: math('F', '=', 'c', '×', 'v', '+', sub('F', 'orifice')),
        numbers: math('F', '=', num(outputs.damping), '×', metres(shaftSpeed), '+', num(orificeForce)),
        result: figure(outputs.force, 'N', 4),
      },
      {
        title: 'Damping of the new piston in the same fluid',
        formula: math(fresh('c'), '=', dampingOf('μ', 'L', 'A', fresh('n'), fresh('d'))),
        numbers: math(
          fresh('c'),
          '=',
          dampingOf(
            num(dynamic, 5),
            metres(pistonThickness),
            num(area, 5),
            num(newHoles, 6),
            metres(newHoleDiameter),
          ),
        ),
        result: figure(outputs.newDamping, 'N·s/m', 4),
      },
      {
        title: 'Fluid with which the new piston damps like yours',
        formula: math(fresh('ν'), '=', matchOf('ν', fresh('n'), fresh('d'), 'n', 'd')),
        numbers: math(
          fresh('ν'),
          '=',
          matchOf(
            num(viscosity, 9),
            num(newHoles, 6),
            num(newHoleDiameter, 6),
            num(holes, 6),
            num(holeDiameter, 6),
          ),
        ),
        result: figure(outputs.viscosityToMatch, 'cSt', 4),
      },
    ],
  }
}
