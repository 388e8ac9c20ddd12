export { springWorking }

import { frac, math, num, power, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { coilSpring, type CoilSpringValues } from './coil-spring.ts'
import type { CalculatorWorking } from '../definition.ts'

type Outputs = Record<'rate' | 'rateLbfPerIn' | 'rateGfPerMm' | 'springIndex', number>

const outside = sub('D', 'outside')
const law = (shear: MathPart, wire: MathPart, mean: MathPart, coils: MathPart) =>
  frac(row(shear, '×', power(wire, '4')), row('8', '×', power(mean, '3'), '×', coils))

function springWorking(inputs: CoilSpringValues, outputs: Outputs): CalculatorWorking {
  const { wireDiameter, outsideDiameter, activeCoils, shearModulus } = inputs
  const { meanDiameter } = coilSpring(inputs)
  const [d, mean, shear] = [num(wireDiameter, 6), num(meanDiameter, 6), num(shearModulus * 1000, 6)]
  return {
    symbols: [
      { symbol: math('d'), means: say`diameter of the wire, ${figure(wireDiameter, 'mm', 6)}` },
      {
        symbol: math(outside),
        means: say`diameter across the outside of the coils, ${figure(outsideDiameter, 'mm', 6)}`,
      },
      {
        symbol: math('D'),
        means: say`diameter of the coils from the middle of the wire to the middle of the wire`,
      },
      { symbol: math('n'), means: say`coils that work, ${figure(activeCoils, '1', 6)}` },
      {
        symbol: math('G'),
        means: say`shear modulus, ${figure(shearModulus, 'GPa', 6)}; in N/mm² that is 1,000 times the number`,
      },
    ],
    steps: [
      {
        title: 'Mean diameter of the coils',
        formula: math('D', '=', outside, '−', 'd'),
        numbers: math('D', '=', num(outsideDiameter, 6), '−', d),
        result: figure(meanDiameter, 'mm', 5),
      },
      {
        title: 'Rate, with lengths in mm and G in N/mm²',
        formula: math('k', '=', law('G', 'd', 'D', 'n')),
        numbers: math('k', '=', law(shear, d, mean, num(activeCoils, 6))),
        result: figure(outputs.rate, 'N/mm', 4),
      },
      {
        title: 'How tightly it is wound',
        formula: math('C', '=', frac('D', 'd')),
        numbers: math('C', '=', frac(mean, d)),
        result: figure(outputs.springIndex, '1', 4),
      },
    ],
  }
}
