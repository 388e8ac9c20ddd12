export { derivation }

import { frac, math, row, sub } from '../mathml.ts'
import type { Derivation } from '../derivation.ts'

/** From what an ampere-hour is to minutes, watt-hours and the setting of the charger. */
const derivation: Derivation = {
  steps: [
    {
      text: 'An ampere-hour is one ampere for one hour: charge is current times time. 5,000 mAh are 5 Ah.',
      formula: math('Q', '=', 'I', '×', 't'),
    },
    {
      text: 'Only a share u of it is driven; the rest stays in to keep the cells from harm. With the time in minutes instead of hours:',
      formula: math('t', '=', 60, '×', frac(row('Q', '×', 'u'), 'I')),
    },
    {
      text: 'Cells in a row share the same current and add their voltages.',
      formula: math('V', '=', 'S', '×', sub('V', 'cell')),
    },
    {
      text: 'Power is voltage times current, and energy is power times time. Over the whole capacity the current drops out.',
      formula: math('E', '=', 'V', '×', 'I', '×', 't', '=', 'V', '×', 'Q'),
    },
    {
      text: 'The C rate measures a current by the pack: at 1C it would give, or take, its whole capacity in one hour.',
      formula: math('r', '=', frac('I', 'Q')),
    },
    {
      text: 'So the charge current is the rate times the capacity, and the whole capacity takes an hour over the rate. The charger lowers the current as the cells near their limit, so the last part takes longer than that.',
      formula: math(sub('t', 'charge'), '=', frac(60, 'c')),
    },
  ],
}
