export { moveWorking }

import { frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking, WorkingStep } from '../definition.ts'

type Inputs = Record<
  'mass' | 'frontWeight' | 'wheelbase' | 'partMass' | 'moveForward' | 'moveLeft' | 'moveUp',
  number
>
type Outputs = Record<'newFrontWeight' | 'cgForward' | 'cgLeft' | 'cgUp', number>

const shift = (part: MathPart, car: MathPart, move: MathPart) => row(move, '×', frac(part, car))
const share = (before: MathPart, distance: MathPart, length: MathPart) =>
  row(before, '+', 100, '×', frac(distance, length))

function moveWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { mass, frontWeight, wheelbase, partMass } = inputs
  const step = (title: string, index: string, move: number, result: number): WorkingStep => ({
    title,
    formula: math(sub('s', index), '=', shift('w', 'm', sub('d', index))),
    numbers: math(sub('s', index), '=', shift(num(partMass, 6), num(mass * 1000, 6), num(move, 6))),
    result: figure(result, 'mm', 4),
  })
  const [after, before, forward] = [sub('f', 'new'), 'f', sub('s', 'forward')]
  return {
    symbols: [
      {
        symbol: math('m'),
        means: say`weight of the whole car, ${figure(mass, 'kg', 6)}; in grams for the sum`,
      },
      { symbol: math('w'), means: say`weight of the part that moves, ${figure(partMass, 'g', 6)}` },
      {
        symbol: math('d'),
        means: say`how far it moves: ${figure(inputs.moveForward, 'mm')} forward, ${figure(inputs.moveLeft, 'mm')} left, ${figure(inputs.moveUp, 'mm')} up`,
      },
      { symbol: math('s'), means: say`how far the centre of gravity moves` },
      { symbol: math('f'), means: say`weight on the front wheels, ${figure(frontWeight, '%', 6)}` },
      { symbol: math('L'), means: say`wheelbase, ${figure(wheelbase, 'mm', 6)}` },
    ],
    steps: [
      step('Centre of gravity forward', 'forward', inputs.moveForward, outputs.cgForward),
      step('To the left', 'left', inputs.moveLeft, outputs.cgLeft),
      step('Up', 'up', inputs.moveUp, outputs.cgUp),
      {
        title: 'Weight on the front wheels, by moments about the rear axle',
        formula: math(after, '=', share(before, forward, 'L')),
        numbers: math(after, '=', share(num(frontWeight, 6), num(outputs.cgForward), num(wheelbase, 6))),
        result: figure(outputs.newFrontWeight, '%', 5),
      },
    ],
  }
}
