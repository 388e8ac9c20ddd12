export { carGroups, carValueByKey, carValues }
export type { CarEnd, CarGroup, CarKey, CarValue, CarValues, EnteredCarKey }

import { carEndNames, type CarEnd } from './car-ends.ts'
import { carRanges } from './car-ranges.ts'
import { pointValues } from './suspension-points.ts'
import type { UnitId } from '#shared/units/units.ts'

const carGroups = {
  whole: 'The whole car',
  corners: 'On four scales',
  wheels: 'Wheels and track',
  gearing: 'Motor and gearing',
  battery: 'Battery and wire',
  diffs: 'Diffs',
  springs: 'Springs',
  shocks: 'Shocks',
  bars: 'Sway bars',
  arms: 'Arms, pins and steering',
  points: 'Suspension points',
} as const
type CarGroup = keyof typeof carGroups

/** One value of the reader's car, with how to get it. Ranges are in `unit` and end inclusive. */
interface CarValue<Key extends string = string> {
  key: Key
  group: CarGroup
  end?: CarEnd
  label: string
  unit: UnitId
  min: number
  max: number
  whole?: true
  /** How to measure it, or where to read it, in one or two sentences. */
  help: string
}

const value = <const Key extends string>(
  group: CarGroup,
  key: Key,
  label: string,
  unit: UnitId,
  [min, max]: readonly [number, number],
  help: string,
  whole?: true,
): CarValue<Key> => ({ key, group, label, unit, min, max, help, ...(whole && { whole }) })

/** The same value at both ends: `both('bars', 'BarDiameter', ...)` makes frontBarDiameter and rearBarDiameter. */
const both = <const Name extends string>(
  group: CarGroup,
  name: Name,
  label: string,
  unit: UnitId,
  range: readonly [number, number],
  help: string,
  whole?: true,
): CarValue<`front${Name}` | `rear${Name}`>[] =>
  (['front', 'rear'] as const).map((end) => ({
    ...value(group, `${end}${name}`, `${carEndNames[end]} ${label}`, unit, range, help, whole),
    end,
  }))

/**
 * Everything that “my car” can hold, in the order in which it is asked for. No value is required: a reader
 * fills in what a calculator asked for. Keys are kept in browsers and in the database, so none is ever renamed.
 */
const carValues = [
  value('whole', 'mass', 'Weight of the whole car', 'kg', carRanges.mass,
    'Ready to race, with battery, body and wing, on a kitchen scale or the sum of four scales.'),
  value('whole', 'frontWeight', 'Weight on the front wheels', '%', carRanges.frontWeight,
    'Put the front wheels on a scale and the rear wheels on a block as high as the scale. Divide by the weight of the whole car.'),
  value('whole', 'wheelbase', 'Wheelbase', 'mm', carRanges.wheelbase,
    'From the middle of a front axle to the middle of the rear axle on the same side, wheels pointing straight.'),
  value('whole', 'cgHeight', 'Height of the centre of gravity', 'mm', carRanges.cgHeight,
    'Lift the front axle and weigh again: the calculator for the height of the centre of gravity works it out. As a start, 40 to 50 mm suits a 1/8 buggy (common practice).'),
  value('whole', 'rearDriveShare', 'Share of the drive at the rear', '%', [0, 100],
    '100 for a two-wheel drive. A four-wheel drive with a diff in the middle sends about 50 each way while both ends grip.'),

  value('corners', 'cornerFrontLeft', 'Front left wheel', 'g', [10, 5000],
    'All four wheels on scales of the same height, shocks settled, battery in.'),
  value('corners', 'cornerFrontRight', 'Front right wheel', 'g', [10, 5000],
    'Read it with the other three, without touching the car.'),
  value('corners', 'cornerRearLeft', 'Rear left wheel', 'g', [10, 5000],
    'Read it with the other three, without touching the car.'),
  value('corners', 'cornerRearRight', 'Rear right wheel', 'g', [10, 5000],
    'Read it with the other three, without touching the car.'),

  value('wheels', 'trackFront', 'Front track', 'mm', [80, 600],
    'Between the middles of the two front tyres where they touch the ground, at ride height.'),
  value('wheels', 'trackRear', 'Rear track', 'mm', [80, 600],
    'Between the middles of the two rear tyres where they touch the ground, at ride height.'),
  value('wheels', 'tyreDiameter', 'Tyre diameter', 'mm', [20, 300],
    'Roll the loaded car forward one turn of the wheel and divide the distance by 3.1416.'),
  value('wheels', 'rimDiameter', 'Rim diameter', 'mm', [10, 250],
    'Across the outer edge of the rim, where you hold the toe gauge.'),

  value('gearing', 'spurTeeth', 'Teeth of the spur gear', '1', [10, 200], 'Printed on it, or count them.', true),
  value('gearing', 'pinionTeeth', 'Teeth of the pinion', '1', [5, 80], 'Stamped on its face, or count them.', true),
  value('gearing', 'ringTeeth', 'Teeth of the ring gear', '1', [1, 200],
    'In the manual, or count them with the diff out. Without a second stage, use 1 here and 1 for its pinion.', true),
  value('gearing', 'diffPinionTeeth', 'Teeth of the diff’s pinion', '1', [1, 100],
    'In the manual, or count them with the gearbox open.', true),
  value('gearing', 'motorKv', 'Motor constant kV', 'rpm/V', [100, 20000], 'On the motor’s label.'),

  value('battery', 'cells', 'Cells in a row', '1', carRanges.cells, 'The number before the S on the battery’s label.', true),
  value('battery', 'capacity', 'Battery capacity', 'mAh', [100, 30000], 'On the battery’s label.'),
  value('battery', 'averageCurrent', 'Average current in a race', 'A', [0.1, 300],
    'Capacity put back by the charger in mAh, times 0.06, divided by the minutes driven. A speed control that logs will tell you too.'),
  value('battery', 'wireGauge', 'Battery wire', 'AWG', [0, 40], 'Printed on the wire.', true),
  value('battery', 'wireLength', 'Length of one battery lead', 'mm', [1, 5000], 'From plug to speed control, one way.'),

  ...(['front', 'centre', 'rear'] as const).map((end) => ({
    ...value('diffs', `${end}DiffFluid`, `${carEndNames[end]} diff fluid`, 'cSt', [0.5, 10_000_000],
      'The number on the bottle you filled it from.'),
    end,
  })),

  ...both('springs', 'SpringRate', 'spring rate', 'N/mm', [0.01, 50], 'From the maker’s table, or worked out from the wire by the calculator for spring rates.'),
  ...both('springs', 'SpringWire', 'spring wire', 'mm', [0.2, 10], 'With a caliper, paint included; measure at three places.'),
  ...both('springs', 'SpringOutside', 'spring outside diameter', 'mm', [2, 100], 'With a caliper across the coils.'),
  ...both('springs', 'SpringCoils', 'working coils', '1', [0.5, 60], 'Count the coils that do not touch their neighbour; quarters count.'),
  ...both('springs', 'MotionRatio', 'motion ratio', '1', [0.05, 2],
    'Lift the wheel 10 mm and measure how much the shock shortens; divide the second by the first.'),
  ...both('springs', 'SprungMass', 'sprung weight of one wheel', 'kg', [0.05, 5],
    'Weight on that axle, less its wheels, hubs and half its arms, divided by two.'),

  ...both('shocks', 'ShockOil', 'shock oil', 'cSt', [0.5, 100_000], 'The number on the bottle in cSt. A weight number is no standard.'),
  ...both('shocks', 'PistonHoles', 'piston holes', '1', [1, 40], 'Count them.', true),
  ...both('shocks', 'PistonHoleDiameter', 'piston hole diameter', 'mm', [0.2, 10], 'Try drill shanks until one just fits.'),
  ...both('shocks', 'PistonThickness', 'piston thickness', 'mm', [0.2, 20], 'With a caliper, beside the holes.'),
  ...both('shocks', 'ShockBore', 'shock bore', 'mm', [3, 60], 'Inside diameter of the shock body.'),
  ...both('shocks', 'ShockRod', 'shock rod', 'mm', [0.5, 30], 'Diameter of the rod that goes in and out.'),

  ...both('bars', 'BarDiameter', 'bar diameter', 'mm', [0.3, 10], 'With a caliper on the straight part.'),
  ...both('bars', 'BarMiddle', 'bar middle', 'mm', [5, 400], 'Between the two bends, along the axle.'),
  ...both('bars', 'BarArm', 'bar arm', 'mm', [2, 200], 'From the middle of the straight part to where the link holds the bar.'),

  ...both('arms', 'ArmLength', 'arm length', 'mm', [10, 300], 'From inner pin to outer pin.'),
  ...both('arms', 'DroopScrewRadius', 'droop screw from the inner pin', 'mm', [2, 150], 'From the middle of the inner pin to where the screw touches.'),
  ...both('arms', 'DroopScrewPitch', 'droop screw pitch', 'mm', [0.1, 3], 'Thread rise of one turn: 0.5 mm for M3, 0.7 mm for M4, 0.8 mm for M5 coarse thread (ISO 261).'),
  ...both('arms', 'BlockSpacing', 'hinge-pin block spacing', 'mm', [5, 300], 'Between the middles of the two blocks that hold the inner pin.'),
  ...both('arms', 'PinAngle', 'inner pin angle', 'deg', [-30, 30], 'Front end of the pin higher counts plus. From the block’s marks or with an angle gauge on the pin.'),
  ...both('arms', 'Toe', 'toe of one wheel', 'deg', [-20, 20], 'Toe-in counts plus. With a toe gauge, ride height set.'),
  value('arms', 'kingpinSpacing', 'Between the steering pivots', 'mm', [20, 500], 'From the axis of one front hub’s pivot to the other, at axle height.'),

  ...pointValues('front'),
  ...pointValues('rear'),
] as const satisfies readonly CarValue[]

/** A value that is entered. */
type EnteredCarKey = (typeof carValues)[number]['key']
/** What calculators may ask a car for: what is entered, and what follows from it (`derived-values.ts`). */
type CarKey =
  | EnteredCarKey
  | 'tyreRadius'
  | 'frontContactY'
  | 'rearContactY'
  | 'frontWheelRate'
  | 'rearWheelRate'

/** A car's values in the units above; what has not been measured is left out. */
type CarValues = Partial<Record<EnteredCarKey, number>>

const byKey = new Map<string, CarValue<EnteredCarKey>>(carValues.map((entry) => [entry.key, entry]))

/** The entered value with this key; undefined for any other text. */
function carValueByKey(key: string): CarValue<EnteredCarKey> | undefined {
  return byKey.get(key)
}
