export { wireCautions }

import type { CalculatorCaution } from '../definition.ts'

/** For everybody who changes the leads of a battery or a speed control. */
const wireCautions: readonly CalculatorCaution[] = [
  {
    kind: 'lithium',
    title: 'Short circuits',
    order: 'Cut, strip and solder one battery lead at a time, and cover its end before you touch the other.',
    reason:
      'Two bare leads that meet, or one blade across both, short the pack: sparks, burns, and a lithium pack that may catch fire. Take the pack out of the car whenever you can, and take rings and watch off. Let somebody who has been shown how solder a plug to a pack, and follow the maker’s leaflet.',
  },
  {
    kind: 'soldering',
    title: 'Soldering',
    order:
      'Wear eye protection, work in moving air on a surface that does not burn, and put the iron in its stand between joints.',
    reason:
      'The tip is at 350\u00A0°C and more, and looks the same cold; solder spits from a tinned wire that springs back. Do not breathe the smoke of the flux. Hold the wire in a clamp, not in your fingers. Wash your hands afterwards, above all with solder that contains lead. A burn: cool running water at once.',
  },
  {
    kind: 'heat',
    title: 'Hot wires and plugs',
    order: 'After a run, hold the back of your hand near wires and plugs before you touch them.',
    reason:
      'A loose plug or a broken strand gets far hotter than this sum says, and hot insulation that rubs through shorts the pack. Replace a lead whose insulation is hard, cut or melted.',
  },
]
