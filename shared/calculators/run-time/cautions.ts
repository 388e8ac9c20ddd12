export { packCautions }

import type { CalculatorCaution } from '../definition.ts'

/**
 * For everybody who charges and carries a lithium pack. Common to makers’ leaflets, which come first; the
 * voltages and times are common practice, no standard’s clause was found for them.
 */
const packCautions: readonly CalculatorCaution[] = [
  {
    kind: 'lithium',
    title: 'The maker’s limits come first',
    order:
      'Keep to the charge current, voltage and temperature that the leaflets of your pack and charger give, whatever this page says.',
    reason:
      'This page counts on 3.7\u00A0V cells; packs of other chemistries or with a higher limit need other settings. Set the charger to the chemistry and the number of cells, and plug in the balance lead. Where no other current is named, 1C is usual.',
  },
  {
    kind: 'lithium',
    title: 'Charging',
    order: 'Never leave a charging pack alone, not even for a minute, and never charge while you sleep.',
    reason:
      'Charge on a hard surface that does not burn, such as stone, concrete or tile, away from your way out, fuel, cleaner and spare packs. Let the pack cool after a run and warm up after frost: most makers say 0 to 45\u00A0°C. If it swells, smokes, hisses or smells sweet, switch off at the wall if you safely can, get people away and call the fire service; its smoke is poisonous.',
  },
  {
    kind: 'lithium',
    title: 'Hurt, punctured or swollen',
    order:
      'Do not charge, use, open or press a pack that is swollen, dented, punctured or wet: take it outside, away from anything that burns.',
    reason:
      'A hurt cell can catch fire minutes or hours later. Set it on bare earth, sand or concrete, not sealed in, and watch it from a distance. A cell that leaks: keep it off your skin and eyes. Hand it in at a collection point as your local rules say, and ask them first; never in household waste.',
  },
  {
    kind: 'lithium',
    title: 'Run down and stored',
    order:
      'Stop when the car goes flat, and store packs about half full, at about 3.8\u00A0V a cell, cool and apart from anything that burns.',
    reason:
      'A cell below about 3.0\u00A0V is harmed and may not be safe to charge again: set the cut-off of the speed control higher. A full pack ages and burns hardest. Cover the plugs so that no metal can join them, and do not leave packs in a hot car.',
  },
]
