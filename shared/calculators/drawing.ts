export type { DrawingHandle, DrawingPoint, DrawingShape, DrawingSpec, DrawingStyle }

import type { Sentence } from './sentence.ts'
import type { UnitId } from '#shared/units/units.ts'

/** A place in the drawing: x to the right, y up, both in the drawing's unit. */
type DrawingPoint = readonly [x: number, y: number]

/**
 * How a line is drawn; never by colour alone.
 * - part: something one can touch (arm, bar, tyre), strong
 * - frame: the chassis and other parts that only hold the rest, thin
 * - thought: a line of the construction that is not there on the car, dashed
 * - before: where the part stood before the change, light and dotted
 * - own: what the answer is about, strong and in the accent colour
 * - ground: the ground, with its hatching below
 */
type DrawingStyle = 'part' | 'frame' | 'thought' | 'before' | 'own' | 'ground'

type DrawingShape =
  | { kind: 'line'; points: readonly DrawingPoint[]; style: DrawingStyle; closed?: true }
  | { kind: 'circle'; at: DrawingPoint; radius: number; style: DrawingStyle }
  /** Angles in degrees, anticlockwise from the direction of x. */
  | { kind: 'arc'; at: DrawingPoint; radius: number; from: number; to: number; style: DrawingStyle }
  | { kind: 'arrow'; from: DrawingPoint; to: DrawingPoint; style: DrawingStyle }
  /** A joint or a point of the construction, always of the same size on the screen. */
  | { kind: 'point'; at: DrawingPoint; style: DrawingStyle }
  /** A length between two places, with its number; `offset` moves the line to the left of the way from → to. */
  | { kind: 'dimension'; from: DrawingPoint; to: DrawingPoint; offset: number; label: Sentence }
  | { kind: 'label'; at: DrawingPoint; anchor: 'start' | 'middle' | 'end'; text: Sentence; style?: DrawingStyle }

/**
 * A point that the reader can take hold of with mouse, finger or arrow keys. Moving it changes the inputs
 * named; the drawing's unit must be theirs. A point that moves one way only names one of them.
 */
interface DrawingHandle {
  at: DrawingPoint
  label: string
  x?: string
  y?: string
}

/** A drawing to scale as data, in the calculator's own units; the same on the server and in the browser. */
interface DrawingSpec {
  /** Under the drawing: what one looks at. */
  caption: string
  /** Says in words what the drawing shows; read aloud in its place. */
  alternative: Sentence
  unit: UnitId
  /** What is in the picture. Keep it still while the values move, or the picture seems not to change. */
  frame: { left: number; right: number; bottom: number; top: number }
  /** In the order of drawing, the last on top. */
  shapes: readonly DrawingShape[]
  handles?: readonly DrawingHandle[]
}
