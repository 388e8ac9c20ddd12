export { gearingCautions }

import type { CalculatorCaution } from '../definition.ts'

const gearingCautions: readonly CalculatorCaution[] = [
  {
    kind: 'heat',
    title: 'Motor and speed control',
    order:
      'After any change to longer gearing drive two minutes, stop, and measure motor and speed control before you drive on.',
    reason:
      'Every tooth more on the pinion loads the motor more, and heat rises faster than speed. A motor too hot to touch burns fingers; one that is over its limit loses its magnets, ' +
      'and a speed control or battery can catch fire. The makers’ temperature limits come first, and a battery that is hot or swollen is not used again.',
  },
  {
    kind: 'spinning',
    title: 'Gears and wheels under power',
    order:
      'Take the pinion out of mesh, or unplug the motor, before you set gear mesh or the radio; never run the car held in the hand.',
    reason:
      'In the air the wheels reach the full speed above within a moment: gears take fingers, hair and sleeves, and a tyre without load grows until it tears. ' +
      'Set the car on a stand, keep faces out of the plane of the wheels, and wear eye protection.',
  },
]
