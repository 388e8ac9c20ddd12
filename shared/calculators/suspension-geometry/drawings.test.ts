import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { answered, car, type Inputs } from './cars-for-tests.ts'
import { poseAt, travelOf } from './curves.ts'
import { calculator } from './index.ts'
import { linkageFrom } from './linkage.ts'

describe('the pictures of suspension-geometry', () => {
  it('plots four curves from droop to bump with the cursor’s point on each', () => {
    fc.assert(
      fc.property(car, fc.double({ min: -1, max: 1, noNaN: true }), (values, share) => {
        const { inputs, outputs } = answered(values)
        const at = share < 0 ? share * values.travelDown : share * values.travelUp
        for (const plot of calculator.plots!(inputs, outputs, at)) {
          const points = plot.lines[0]?.points ?? []
          expect([points.at(0)?.[0], points.at(-1)?.[0]]).toEqual([plot.x.min, plot.x.max])
          for (const [, y] of [...points, [0, plot.points[0]?.y ?? NaN] as const]) {
            expect(y).toBeGreaterThanOrEqual(plot.y.min)
            expect(y).toBeLessThanOrEqual(plot.y.max)
          }
          expect(plot.points[0]?.x).toBeCloseTo(at, 9)
        }
      }),
      { numRuns: 20 },
    )
  })

  it('draws the joints where they are, with handles at ride height that move the values they name', () => {
    const { inputs, outputs } = answered({})
    for (const at of [0, 20, -15]) {
      const [drawing] = calculator.drawings!(inputs, outputs, at)
      for (const { at: place, x, y } of drawing!.handles ?? []) {
        if (x !== undefined) expect(place[0]).toBe(inputs[x as keyof Inputs])
        if (y !== undefined) expect(place[1]).toBe(inputs[y as keyof Inputs])
      }
      const linkage = linkageFrom(inputs)
      const pose = poseAt(linkage, travelOf(linkage, 25, 20), at)
      const joints = drawing!.shapes.flatMap((shape) =>
        shape.kind === 'point' && shape.style === 'part' ? [shape.at] : [],
      )
      expect(joints[1]).toEqual(pose.lowerOuter)
      const ground = drawing!.shapes.find((shape) => shape.kind === 'line' && shape.style === 'ground')
      expect(ground?.kind === 'line' && ground.points[0]?.[1]).toBeCloseTo(at, 9)
    }
    const named = new Set(calculator.drawings!(inputs, outputs, 0)[0]?.handles?.flatMap(({ x, y }) => [x, y]))
    for (const { key } of calculator.inputs) {
      expect(named.has(key)).toBe(!['steeringArm', 'travelUp', 'travelDown'].includes(key))
    }
  })

  it('keeps both pictures still while the cursor moves, and everything inside them', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { inputs, outputs } = answered(values)
        const frames = [-values.travelDown, 0, values.travelUp].map((at) =>
          calculator.drawings!(inputs, outputs, at).map(({ frame, shapes }) => {
            const drawn = shapes.flatMap((shape) =>
              shape.kind === 'line' ? [...shape.points] : shape.kind === 'point' ? [shape.at] : [],
            )
            const outside = drawn.filter(
              ([x, y]) =>
                x < frame.left - 1e-6 ||
                x > frame.right + 1e-6 ||
                y < frame.bottom - 1e-6 ||
                y > frame.top + 1e-6,
            )
            expect(outside).toEqual([])
            return frame
          }),
        )
        expect(frames[1]).toEqual(frames[0])
        expect(frames[2]).toEqual(frames[0])
      }),
      { numRuns: 20 },
    )
  })
})
