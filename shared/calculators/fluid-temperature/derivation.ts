export { derivation }

import { fenced, fn, frac, math, power, row, sub } from '../mathml.ts'
import type { Derivation } from '../derivation.ts'

const at25 = sub('ν', '25')
const bracket = fenced(frac(1, row(273, '+', 'T')), '−', frac(1, 298))

/** From measured thickness to the factor that holds for every bottle. */
const derivation: Derivation = {
  steps: [
    {
      text: 'A liquid flows when its molecules find the energy to slip past one another. Of all molecules, the share that has the energy E grows with the absolute temperature as this law says, and the liquid gets thinner in proportion.',
      formula: math('ν', '=', 'A', '×', power('e', frac('E', row('R', '×', fenced('273', '+', 'T'))))),
    },
    {
      text: 'Take logarithms: against one over the absolute temperature the thickness is a straight line. That is how a maker’s measurements are drawn, and one slope fits.',
      formula: math(fn('log', 'ν'), '=', frac('b', row(273, '+', 'T')), '+', 'a'),
    },
    {
      text: 'For dimethyl silicone the slope comes out nearly the same for thin and thick fluids, because long chains slip past one another piece by piece. The maker gives one number for all of them.',
      formula: math('b', '=', 763.1),
    },
    {
      text: 'The bottle says how thick the fluid is at 25\u00A0°C, which is 298 above absolute zero. Put that in to get rid of a.',
      formula: math('a', '=', fn('log', at25), '−', frac(763.1, 298)),
    },
    {
      text: 'What is left is the number on the bottle times a factor that the temperature alone decides.',
      formula: math('ν', '=', at25, '×', power(10, row(763.1, '×', bracket))),
    },
    {
      text: 'Two temperatures therefore change every bottle by the same factor r, and the bottle that feels hot as yours did is yours divided by it.',
      formula: math('r', '=', frac('ν', sub('ν', 'then')), ',', sub('ν', 'match'), '=', frac(at25, 'r')),
    },
  ],
}
