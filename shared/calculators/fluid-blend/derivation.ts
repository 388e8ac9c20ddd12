export { derivation }

import { fenced, fn, frac, math, row, sub } from '../mathml.ts'
import type { Derivation } from '../derivation.ts'

const thin = sub('ν', 'thin')
const thick = sub('ν', 'thick')

/** From shares of logarithms to the share to measure out. */
const derivation: Derivation = {
  steps: [
    {
      text: 'Thickness does not add up: half of each fluid does not give the thickness half-way between. Each drop of thick fluid multiplies the thickness by a little, it does not add a little.',
    },
    {
      text: 'What multiplies adds up as logarithms. Each fluid counts by its share x of the weight, and the shares together are one.',
      formula: math(fn('ln', 'ν'), '=', 'x', '×', fn('ln', thick), '+', fenced('1', '−', 'x'), '×', fn('ln', thin)),
    },
    {
      text: 'Gather what stands with x.',
      formula: math(fn('ln', 'ν'), '−', fn('ln', thin), '=', 'x', '×', fenced(fn('ln', thick), '−', fn('ln', thin))),
    },
    {
      text: 'A difference of logarithms is the logarithm of a ratio, so the share depends on ratios of thickness only.',
      formula: math('x', '=', frac(fn('ln', fenced(frac('ν', thin))), fn('ln', fenced(frac(thick, thin))))),
    },
    {
      text: 'Silicone fluids of one family weigh nearly the same a millilitre, so the share by weight is the share by volume.',
      formula: math(sub('V', 'thick'), '=', 'x', '×', 'V'),
    },
    {
      text: 'Neither this rule nor the second one is a standard for silicone. The second takes another curved scale B in place of the logarithm; where both agree you can trust the mix, and how far they differ says how much to mix for a try first.',
      formula: math('x', '=', frac(row('B', fenced('ν'), '−', 'B', fenced(thin)), row('B', fenced(thick), '−', 'B', fenced(thin)))),
    },
  ],
}
