export { armDrawing }

import { say } from '#shared/calculators/sentence.ts'
import type { DrawingSpec } from '#shared/calculators/drawing.ts'

/** A drawing with every kind of shape, for tests: an arm 100 mm long above the ground, held at 0, 40. */
function armDrawing(outer: readonly [number, number] = [100, 30]): DrawingSpec {
  return {
    caption: 'An arm from the front, to scale.',
    alternative: say`An arm of about 100 mm.`,
    unit: 'mm',
    frame: { left: -20, right: 120, bottom: -10, top: 80 },
    shapes: [
      { kind: 'line', points: [[-20, 0], [120, 0]], style: 'ground' },
      { kind: 'line', points: [[0, 40], outer], style: 'part' },
      { kind: 'line', points: [[-10, 30], [10, 30], [10, 50], [-10, 50]], style: 'frame', closed: true },
      { kind: 'line', points: [[0, 40], [100, 40]], style: 'thought' },
      { kind: 'circle', at: [100, 30], radius: 20, style: 'before' },
      { kind: 'arc', at: [0, 40], radius: 30, from: 0, to: -90, style: 'thought' },
      { kind: 'arrow', from: [50, 0], to: [50, 20], style: 'own' },
      { kind: 'point', at: outer, style: 'own' },
      { kind: 'dimension', from: [0, 40], to: [100, 40], offset: 10, label: say`100 mm` },
      { kind: 'label', at: [100, 30], anchor: 'start', text: say`outer pin` },
      { kind: 'label', at: [100, 30], anchor: 'start', text: say`the same place`, style: 'own' },
    ],
    handles: [{ at: outer, label: 'Outer pin', x: 'across', y: 'up' }],
  }
}
