export { blendWorking }

import { fenced, fn, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { blendingNumber } from './blend.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'lowViscosity' | 'highViscosity' | 'targetViscosity' | 'totalVolume', number>
type Outputs = Record<'highFraction' | 'highVolume' | 'lowVolume' | 'highFractionVbn', number>

const low = sub('ν', 'thin')
const high = sub('ν', 'thick')
const ratioOfLogs = (target: MathPart, thin: MathPart, thick: MathPart) =>
  frac(fn('ln', fenced(frac(target, thin))), fn('ln', fenced(frac(thick, thin))))
const vbnOf = (viscosity: MathPart) =>
  row(14.534, '×', fn('ln', fenced(fn('ln', fenced(viscosity, '+', 0.8)))), '+', 10.975)

function blendWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { lowViscosity, highViscosity, targetViscosity, totalVolume } = inputs
  const symbols = [
    { symbol: math('ν'), means: say`the thickness you want, ${figure(targetViscosity, 'cSt', 9)}` },
    { symbol: math(low), means: say`the thinner fluid, ${figure(lowViscosity, 'cSt', 9)}` },
    { symbol: math(high), means: say`the thicker fluid, ${figure(highViscosity, 'cSt', 9)}` },
    { symbol: math('x'), means: say`share of the thicker fluid by weight, taken as its share by volume` },
    { symbol: math('V'), means: say`how much you need, ${figure(totalVolume, 'mL', 6)}` },
    { symbol: math(sub('B', 'ν')), means: say`blending number of a fluid of thickness ν` },
  ]
  if (lowViscosity === highViscosity) {
    return {
      symbols,
      steps: [
        {
          title: 'Both fluids are the same, so any share gives the thickness; half is shown.',
          result: figure(0.5, '1'),
        },
      ],
    }
  }
  return { symbols, steps: [...logLinearSteps(inputs, outputs), ...refutasSteps(inputs, outputs)] }
}

function logLinearSteps(
  { lowViscosity, highViscosity, targetViscosity, totalVolume }: Inputs,
  outputs: Outputs,
) {
  const x = num(outputs.highFraction)
  return [
    {
      title: 'Share of the thicker fluid: logarithms of thickness add up by share',
      formula: math('x', '=', ratioOfLogs('ν', low, high)),
      numbers: math(
        'x',
        '=',
        ratioOfLogs(num(targetViscosity, 9), num(lowViscosity, 9), num(highViscosity, 9)),
      ),
      result: figure(outputs.highFraction, '1', 4),
    },
    {
      title: 'Thicker fluid to measure out',
      formula: math(sub('V', 'thick'), '=', 'x', '×', 'V'),
      numbers: math(sub('V', 'thick'), '=', x, '×', num(totalVolume)),
      result: figure(outputs.highVolume, 'mL', 4),
    },
    {
      title: 'Thinner fluid to measure out',
      formula: math(sub('V', 'thin'), '=', fenced(1, '−', 'x'), '×', 'V'),
      numbers: math(sub('V', 'thin'), '=', fenced(1, '−', x), '×', num(totalVolume)),
      result: figure(outputs.lowVolume, 'mL', 4),
    },
  ]
}

function refutasSteps({ lowViscosity, highViscosity, targetViscosity }: Inputs, outputs: Outputs) {
  const [wanted, thin, thick] = [targetViscosity, lowViscosity, highViscosity].map((viscosity) =>
    num(blendingNumber(viscosity), 6),
  ) as [MathPart, MathPart, MathPart]
  const name = (index: MathPart) => row('B', fenced(index))
  return [
    {
      title: 'Second rule: the blending number of a fluid',
      formula: math(name('ν'), '=', vbnOf('ν')),
      numbers: math(name(num(targetViscosity, 9)), '=', vbnOf(num(targetViscosity, 9))),
      result: figure(blendingNumber(targetViscosity), '1', 6),
    },
    {
      title: 'Second rule: share of the thicker fluid, because blending numbers add up by share',
      formula: math('x', '=', frac(row(name('ν'), '−', name(low)), row(name(high), '−', name(low)))),
      numbers: math('x', '=', frac(row(wanted, '−', thin), row(thick, '−', thin))),
      result: figure(outputs.highFractionVbn, '1', 4),
    },
  ]
}
