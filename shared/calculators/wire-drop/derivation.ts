export { derivation }

import { fenced, frac, math, power, row, sub } from '../mathml.ts'
import type { Derivation } from '../derivation.ts'

const resistivity = sub('ρ', '20')

/** From the gauge number to copper, resistance, voltage and heat. */
const derivation: Derivation = {
  steps: [
    {
      text: 'The gauge fixes two sizes: number 36 is 0.005 inch, 0.127 mm, and number 0000, which counts as −3, is 0.46 inch, 92 times as thick. The 39 steps between them all have the same ratio.',
      formula: math('d', '=', '0.127', '×', power('92', frac(row('36', '−', 'n'), '39'))),
    },
    {
      text: 'Six numbers further up the wire is about half as thick, three numbers further its area is about half. A stranded wire of the same number has that much metal in all its strands.',
      formula: math('A', '=', frac(row('π', '×', power('d', '2')), '4')),
    },
    {
      text: 'Resistance is in proportion to length and to one over the area. What flows out through one lead comes back through the other, so the length counts twice.',
      formula: math('R', '=', 'ρ', '×', frac(row('2', '×', 'l'), 'A')),
    },
    {
      text: 'Copper resists more when it is warm, by 0.393 % for each degree from 20 °C.',
      formula: math('ρ', '=', resistivity, '×', fenced('1', '+', '0.00393', '×', fenced('T', '−', '20'))),
    },
    {
      text: 'Ohm’s law gives the voltage that the leads keep from the motor.',
      formula: math('U', '=', 'I', '×', 'R'),
    },
    {
      text: 'That voltage times the current is heat. It grows with the square of the current: twice the current, four times the heat.',
      formula: math('P', '=', 'U', '×', 'I', '=', power('I', '2'), '×', 'R'),
    },
  ],
}
