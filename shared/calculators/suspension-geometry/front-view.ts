export { clipped, inside, mirrored, sideShapes, tyreRadius }
export type { Frame }

import { cosine, sine } from '../common/degrees.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec, DrawingStyle } from '../drawing.ts'
import type { Linkage, Point } from './linkage.ts'

type Frame = DrawingSpec['frame']

/**
 * Radius for the tyre's outline. Its size is not asked for: the axle is taken half-way between the outer joints at
 * ride height.
 */
function tyreRadius({ lowerOuter, upperOuter }: Linkage): number {
  return Math.max(15, (lowerOuter[1] + upperOuter[1]) / 2)
}

/** One side from the front: chassis, arms, tie rod, upright and tyre, turned by `turned` radians with the upright. */
function sideShapes(
  linkage: Linkage,
  { turned, radius }: { turned: number; radius: number },
  style: DrawingStyle = 'part',
): DrawingShape[] {
  const { lowerInner, lowerOuter, upperInner, upperOuter, tieRodInner, tieRodOuter, contact } = linkage
  /** A place on the wheel: across it to the outside, and up it from the ground. */
  const onWheel = (across: number, up: number): DrawingPoint => [
    contact[0] + across * Math.cos(turned) - up * Math.sin(turned),
    contact[1] + across * Math.sin(turned) + up * Math.cos(turned),
  ]
  const half = 0.36 * radius
  const line = (points: readonly DrawingPoint[], drawn: DrawingStyle = style): DrawingShape => ({
    kind: 'line',
    style: drawn,
    points,
  })
  return [
    line([[0, lowerInner[1]], lowerInner, upperInner, [0, upperInner[1]]], 'frame'),
    { kind: 'line', style, closed: true, points: rounded(half, 0, 2 * radius, 0.5 * half, onWheel) },
    {
      kind: 'line',
      style: 'frame',
      closed: true,
      points: rounded(0.8 * half, 0.42 * radius, 1.58 * radius, 0, onWheel),
    },
    line([tieRodInner, tieRodOuter], 'frame'),
    line([lowerInner, lowerOuter]),
    line([upperInner, upperOuter]),
    line([lowerOuter, upperOuter]),
    line([middle(lowerOuter, upperOuter), onWheel(-half, radius)]),
  ]
}

/** A box across the wheel with rounded corners, from one height to another. */
function rounded(
  half: number,
  from: number,
  to: number,
  radius: number,
  onWheel: (across: number, up: number) => DrawingPoint,
): DrawingPoint[] {
  return (
    [
      [half - radius, to - radius, 0],
      [radius - half, to - radius, 90],
      [radius - half, from + radius, 180],
      [half - radius, from + radius, 270],
    ] as const
  ).flatMap(([across, up, start]) =>
    (radius === 0 ? [0] : [0, 22.5, 45, 67.5, 90]).map((turn) =>
      onWheel(across + radius * cosine(start + turn), up + radius * sine(start + turn)),
    ),
  )
}

/** The same on the other side of the car. */
function mirrored(linkage: Linkage): Linkage {
  const flip = ([y, z]: Point): Point => [-y, z]
  return {
    ...linkage,
    lowerInner: flip(linkage.lowerInner),
    lowerOuter: flip(linkage.lowerOuter),
    upperInner: flip(linkage.upperInner),
    upperOuter: flip(linkage.upperOuter),
    tieRodInner: flip(linkage.tieRodInner),
    tieRodOuter: flip(linkage.tieRodOuter),
    contact: flip(linkage.contact),
  }
}

function inside([x, y]: DrawingPoint, { left, right, bottom, top }: Frame): boolean {
  return x >= left && x <= right && y >= bottom && y <= top
}

/** The part of a line that lies in the picture; none where it misses it. Ends may be very far away. */
function clipped(from: DrawingPoint, to: DrawingPoint, frame: Frame, style: DrawingStyle): DrawingShape[] {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]]
  let [begin, end] = [0, 1]
  for (const [step, room] of [
    [-dx, from[0] - frame.left],
    [dx, frame.right - from[0]],
    [-dy, from[1] - frame.bottom],
    [dy, frame.top - from[1]],
  ] as const) {
    if (step === 0 && room < 0) return []
    if (step < 0) begin = Math.max(begin, room / step)
    if (step > 0) end = Math.min(end, room / step)
  }
  if (begin >= end) return []
  const at = (share: number): DrawingPoint => [from[0] + share * dx, from[1] + share * dy]
  return [{ kind: 'line', style, points: [at(begin), at(end)] }]
}

function middle(one: Point, other: Point): Point {
  return [(one[0] + other[0]) / 2, (one[1] + other[1]) / 2]
}
