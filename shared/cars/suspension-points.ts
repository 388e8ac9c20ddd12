export { pointValues }

import type { CarValue } from './car-values.ts'

type Name =
  | 'LowerInnerY'
  | 'LowerInnerZ'
  | 'LowerOuterY'
  | 'LowerOuterZ'
  | 'UpperInnerY'
  | 'UpperInnerZ'
  | 'UpperOuterY'
  | 'UpperOuterZ'
  | 'TieRodInnerY'
  | 'TieRodInnerZ'
  | 'TieRodOuterY'
  | 'TieRodOuterZ'

const points = {
  LowerInner: 'lower arm, inner pin',
  LowerOuter: 'lower arm, outer pin',
  UpperInner: 'upper link, inner end',
  UpperOuter: 'upper link, outer end',
  TieRodInner: 'tie rod, inner end',
  TieRodOuter: 'tie rod, outer end',
} as const

const axes = {
  Y: { words: 'out', help: 'Sideways from the middle of the car to the middle of the pin or ball, at ride height.', range: [-50, 400] },
  Z: { words: 'up', help: 'From the ground to the middle of the pin or ball, at ride height, the car on a flat plate.', range: [-50, 400] },
} as const

/** The joints of one side seen from the front, at one end of the car: how far out and how far up each stands. */
function pointValues<const End extends 'front' | 'rear'>(end: End): CarValue<`${End}${Name}`>[] {
  return (Object.keys(points) as (keyof typeof points)[]).flatMap((point) =>
    (['Y', 'Z'] as const).map((axis) => ({
      key: `${end}${point}${axis}` as const,
      group: 'points' as const,
      end,
      label: `${end === 'front' ? 'Front' : 'Rear'} ${points[point]}, ${axes[axis].words}`,
      unit: 'mm' as const,
      min: axes[axis].range[0],
      max: axes[axis].range[1],
      help: axes[axis].help,
    })),
  )
}
