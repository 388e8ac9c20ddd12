export { balanceInputs }

import { carMass, cgHeight, frontWeight, wheelbase } from '../common/car-inputs.ts'

const track = {
  unit: 'mm',
  default: 255,
  min: 80,
  max: 600,
  step: 1,
  reason: 'cars of this kind are not built narrower or wider',
  help: 'Between the middles of the two tyres where they touch the ground.',
} as const
const rollCentre = {
  unit: 'mm',
  min: -150,
  max: 200,
  step: 1,
  reason: 'further from the ground the arms of no car put it',
  help: 'Above the ground; below it counts minus. “What your arms do to the wheel” gives it.',
} as const
const wheelRate = {
  unit: 'N/mm',
  min: 0.001,
  max: 200,
  step: 0.01,
  reason: 'no wheel of a model car is sprung softer or harder',
  help: 'At the wheel, not of the spring. “What your spring is worth at the wheel” gives it.',
} as const
const barRate = {
  unit: 'N/mm',
  min: 0,
  max: 200,
  step: 0.01,
  reason: 'less than no bar there is not, and more no car carries',
  help: 'At the wheel: the rate of one end (“How stiff a sway bar is”), times the square of end travel over wheel travel. No bar is 0.',
} as const

const balanceInputs = [
  { ...wheelRate, key: 'wheelRateFront', label: 'Front wheel rate', default: 0.3, carKey: 'frontWheelRate' },
  { ...wheelRate, key: 'wheelRateRear', label: 'Rear wheel rate', default: 0.28, carKey: 'rearWheelRate' },
  { ...barRate, key: 'barRateFront', label: 'Front sway bar', default: 0.2 },
  { ...barRate, key: 'barRateRear', label: 'Rear sway bar', default: 0.15 },
  { ...rollCentre, key: 'rollCentreFront', label: 'Front roll centre', default: 15 },
  { ...rollCentre, key: 'rollCentreRear', label: 'Rear roll centre', default: 20 },
  {
    key: 'lateralAcceleration',
    label: 'Side acceleration',
    unit: 'g0',
    default: 1,
    min: 0.1,
    max: 5,
    step: 0.1,
    reason: 'with less nothing moves, and no tyre grips for more',
    help: 'About 0.6 on loose dirt, 1 on hard clay, 2 and more on carpet (common practice).',
  },
  carMass,
  frontWeight,
  wheelbase,
  cgHeight,
  { ...track, key: 'trackFront', label: 'Front track', carKey: 'trackFront' },
  { ...track, key: 'trackRear', label: 'Rear track', carKey: 'trackRear' },
] as const
