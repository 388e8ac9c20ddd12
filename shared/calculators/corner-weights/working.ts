export { cornerWorking }

import { fenced, frac, math, num, row, sub, type MathNode } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking, WorkingStep } from '../definition.ts'
import type { CornerInputs } from './wheel-loads.ts'

type Outputs = Record<
  'total' | 'frontShare' | 'leftShare' | 'crossWeight' | 'cgFromFrontAxle' | 'cgFromCentreLine',
  number
>

const [fl, fr, rl, rr] = ['FL', 'FR', 'RL', 'RR'].map((wheel) => sub('W', wheel)) as [
  MathNode,
  MathNode,
  MathNode,
  MathNode,
]
const percent = (over: MathNode, under: MathNode | string) => row(100, '×', frac(over, under))
const plus = (one: MathNode, other: MathNode) => row(one, '+', other)

function cornerWorking(car: CornerInputs, outputs: Outputs): CalculatorWorking {
  const [nfl, nfr, nrl, nrr] = [car.frontLeft, car.frontRight, car.rearLeft, car.rearRight].map((grams) =>
    num(grams, 6),
  ) as [MathNode, MathNode, MathNode, MathNode]
  const total = num(outputs.total, 6)
  const share = (
    title: string,
    name: string,
    [one, other]: readonly [MathNode, MathNode],
    [oneNumber, otherNumber]: readonly [MathNode, MathNode],
    value: number,
  ): WorkingStep => ({
    title,
    formula: math(name, '=', percent(plus(one, other), 'W')),
    numbers: math(name, '=', percent(plus(oneNumber, otherNumber), total)),
    result: figure(value, '%', 5),
  })
  const moments = (
    w: readonly [MathNode, MathNode, MathNode, MathNode],
    front: MathNode,
    rear: MathNode,
    all: MathNode | string,
  ) =>
    frac(
      row(fenced(w[0], '−', w[1]), '×', front, '+', fenced(w[2], '−', w[3]), '×', rear),
      row('2', '×', all),
    )
  return {
    symbols: [
      { symbol: math(fl), means: say`reading of the front left wheel, ${figure(car.frontLeft, 'g', 6)}` },
      { symbol: math(fr), means: say`front right, ${figure(car.frontRight, 'g', 6)}` },
      { symbol: math(rl), means: say`rear left, ${figure(car.rearLeft, 'g', 6)}` },
      { symbol: math(rr), means: say`rear right, ${figure(car.rearRight, 'g', 6)}` },
      { symbol: math('L'), means: say`wheelbase, ${figure(car.wheelbase, 'mm', 6)}` },
      { symbol: math(sub('t', 'F')), means: say`front track, ${figure(car.trackFront, 'mm', 6)}` },
      { symbol: math(sub('t', 'R')), means: say`rear track, ${figure(car.trackRear, 'mm', 6)}` },
    ],
    steps: [
      {
        title: 'Weight of the car',
        formula: math('W', '=', fl, '+', fr, '+', rl, '+', rr),
        numbers: math('W', '=', nfl, '+', nfr, '+', nrl, '+', nrr),
        result: figure(outputs.total, 'g', 6),
      },
      share('Share of the front', 'f', [fl, fr], [nfl, nfr], outputs.frontShare),
      share('Share of the left', 'l', [fl, rl], [nfl, nrl], outputs.leftShare),
      share('Cross weight', 'c', [fr, rl], [nfr, nrl], outputs.crossWeight),
      {
        title: 'Centre of gravity behind the front axle, by moments about that axle',
        formula: math('a', '=', 'L', '×', frac(plus(rl, rr), 'W')),
        numbers: math('a', '=', num(car.wheelbase, 6), '×', frac(plus(nrl, nrr), total)),
        result: figure(outputs.cgFromFrontAxle, 'mm', 5),
      },
      {
        title: 'Centre of gravity left of the centre line, by moments about that line',
        formula: math('y', '=', moments([fl, fr, rl, rr], sub('t', 'F'), sub('t', 'R'), 'W')),
        numbers: math(
          'y',
          '=',
          moments([nfl, nfr, nrl, nrr], num(car.trackFront, 6), num(car.trackRear, 6), total),
        ),
        result: figure(outputs.cgFromCentreLine, 'mm', 4),
      },
    ],
  }
}
