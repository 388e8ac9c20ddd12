export { barWorking }

import { frac, math, num, power, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { barCompliance, type BarValues } from './bar.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = BarValues & { comparisonDiameter: number }
type Outputs = Record<'endRate' | 'comparisonEndRate' | 'ratio', number>

const polar = (wire: MathPart) => frac(row('π', '×', power(wire, '4')), '32')
const twisted = (arm: MathPart, middle: MathPart, shear: MathPart, section: MathPart) =>
  frac(row(power(arm, '2'), '×', middle), row('2', '×', shear, '×', section))
const bent = (arm: MathPart, young: MathPart, section: MathPart) =>
  frac(power(arm, '3'), row('3', '×', young, '×', section))

function barWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { diameter, middleLength, armLength, shearModulus, youngsModulus, comparisonDiameter } = inputs
  const { twist, bending } = barCompliance(inputs)
  const section = (Math.PI * diameter ** 4) / 32
  const [d, a, b] = [num(diameter, 6), num(armLength, 6), num(middleLength, 6)]
  const [twistSum, bendingSum, together] = [
    sub('c', 'twist'),
    sub('c', 'bend'),
    row(sub('c', 'twist'), '+', sub('c', 'bend')),
  ]
  return {
    symbols: [
      { symbol: math('d'), means: say`diameter of the bar, ${figure(diameter, 'mm', 6)}` },
      {
        symbol: math('a'),
        means: say`arm, from the middle of the straight part to the link, ${figure(armLength, 'mm', 6)}`,
      },
      { symbol: math('b'), means: say`straight part between the bends, ${figure(middleLength, 'mm', 6)}` },
      {
        symbol: math('G'),
        means: say`shear modulus, ${figure(shearModulus, 'GPa', 6)}; in N/mm² that is 1,000 times the number`,
      },
      { symbol: math('E'), means: say`Young’s modulus, ${figure(youngsModulus, 'GPa', 6)}; the same` },
      {
        symbol: math('J'),
        means: say`polar moment of the round section, for twisting; the moment for bending, I, is half of it`,
      },
      { symbol: math('c'), means: say`give: millimetres for each newton` },
    ],
    steps: [
      {
        title: 'Polar moment of the section, in mm⁴',
        formula: math('J', '=', polar('d')),
        numbers: math('J', '=', polar(d)),
        result: figure(section, '1', 5),
      },
      {
        title: 'Give by the twist of half the middle, in mm/N',
        formula: math(twistSum, '=', twisted('a', 'b', 'G', 'J')),
        numbers: math(twistSum, '=', twisted(a, b, num(shearModulus * 1000, 6), num(section, 5))),
        result: figure(twist, '1', 4),
      },
      {
        title: 'Give by the bending of one arm, in mm/N',
        formula: math(bendingSum, '=', bent('a', 'E', 'I')),
        numbers: math(bendingSum, '=', bent(a, num(youngsModulus * 1000, 6), num(section / 2, 5))),
        result: figure(bending, '1', 4),
      },
      {
        title: 'Rate of one end: the two gives add up',
        formula: math('k', '=', frac('1', together)),
        numbers: math('k', '=', frac('1', row(num(twist), '+', num(bending)))),
        result: figure(outputs.endRate, 'N/mm', 4),
      },
      {
        title: 'The other bar: both gives go by the fourth power of the diameter',
        formula: math(
          sub('k', 'other'),
          '=',
          'k',
          '×',
          power(row('(', frac(sub('d', 'other'), 'd'), ')'), '4'),
        ),
        numbers: math(
          sub('k', 'other'),
          '=',
          num(outputs.endRate),
          '×',
          power(row('(', frac(num(comparisonDiameter, 6), d), ')'), '4'),
        ),
        result: figure(outputs.comparisonEndRate, 'N/mm', 4),
      },
    ],
  }
}
