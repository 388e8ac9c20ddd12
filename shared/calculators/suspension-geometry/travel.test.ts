import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { answered, car, near, posesOf, refused, run, type Inputs } from './cars-for-tests.ts'
import { poseAt, travelOf } from './curves.ts'
import { calculator } from './index.ts'
import { linkageFrom, motionOf, velocityOf, type Point } from './linkage.ts'

const apart = (one: Point, other: Point) => Math.hypot(one[0] - other[0], one[1] - other[1])

describe('the linkage of suspension-geometry', () => {
  it('keeps every arm, the upright and the tie rod as long as they are over the travel', () => {
    fc.assert(
      fc.property(car, (values) => {
        const rest = linkageFrom(values)
        for (const pose of posesOf(values)) {
          expect(apart(rest.lowerInner, pose.lowerOuter)).toBeCloseTo(
            apart(rest.lowerInner, rest.lowerOuter),
            8,
          )
          expect(apart(rest.upperInner, pose.upperOuter)).toBeCloseTo(
            apart(rest.upperInner, rest.upperOuter),
            8,
          )
          expect(apart(pose.lowerOuter, pose.upperOuter)).toBeCloseTo(
            apart(rest.lowerOuter, rest.upperOuter),
            8,
          )
          expect(apart(pose.lowerOuter, pose.contact)).toBeCloseTo(apart(rest.lowerOuter, rest.contact), 8)
          expect(pose.contact[1]).toBeCloseTo(pose.travel, 9)
          const pull = Math.sin((pose.toe * Math.PI) / 180) * values.steeringArm
          const end: Point = [pose.tieRodOuter[0] - pull, pose.tieRodOuter[1]]
          expect(apart(rest.tieRodInner, end)).toBeCloseTo(apart(rest.tieRodInner, rest.tieRodOuter), 8)
        }
      }),
      { numRuns: 20 },
    )
  })

  it('is at ride height what it is at ride height, and its curves start with its slopes', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { outputs } = answered(values)
        const linkage = linkageFrom(values)
        const travel = travelOf(linkage, values.travelUp, values.travelDown)
        expect(poseAt(linkage, travel, 0)).toMatchObject({ camber: 0, toe: 0, track: 2 * values.contactY })
        expect(poseAt(linkage, travel, 0).rollCentre).toBe(outputs.rollCentreHeight)
        const [below, above] = [poseAt(linkage, travel, -1e-3), poseAt(linkage, travel, 1e-3)]
        expect((above.camber - below.camber) / 2e-3).toBeCloseTo(outputs.camberGain, 5)
        expect((above.toe - below.toe) / 2e-3).toBeCloseTo(outputs.bumpSteer, 5)
      }),
    )
  })

  it('has the same angles at twice the size, and every length doubles', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { outputs } = answered(values)
        const doubled = Object.fromEntries(
          Object.entries(values).map(([key, value]) => [key, 2 * value]),
        ) as Inputs
        const twice = answered(doubled).outputs
        const close = (one: number, other: number) =>
          expect(Math.abs(one - other)).toBeLessThan(1e-6 * (1 + Math.abs(other)))
        close(twice.instantCentreY, 2 * outputs.instantCentreY)
        close(twice.instantCentreZ, 2 * outputs.instantCentreZ)
        close(twice.rollCentreHeight, 2 * outputs.rollCentreHeight)
        close(twice.camberGain, outputs.camberGain / 2)
        close(twice.bumpSteer, outputs.bumpSteer / 2)
      }),
    )
  })

  it('puts the instant centre on both arms and the roll centre on the line from there to the tyre', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { instantCentreY: y, instantCentreZ: z, rollCentreHeight } = answered(values).outputs
        fc.pre(Math.abs(y) < 1e4)
        const { lowerInner, lowerOuter, upperInner, upperOuter } = linkageFrom(values)
        const off = (from: Point, to: Point) =>
          ((to[0] - from[0]) * (z - from[1]) - (to[1] - from[1]) * (y - from[0])) / apart(from, to)
        expect(off(lowerInner, lowerOuter)).toBeCloseTo(0, 6)
        expect(off(upperInner, upperOuter)).toBeCloseTo(0, 6)
        expect(rollCentreHeight * (values.contactY - y)).toBeCloseTo(z * values.contactY, 4)
      }),
    )
  })

  it('does not steer at ride height when the tie rod points at the instant centre', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { instantCentreY: y, instantCentreZ: z } = answered(values).outputs
        fc.pre(Math.abs(y) < 1e4 && Math.abs(y - values.tieRodOuterY) > 20)
        const share = (values.tieRodInnerY - values.tieRodOuterY) / (y - values.tieRodOuterY)
        const tieRodInnerZ = values.tieRodOuterZ + share * (z - values.tieRodOuterZ)
        const result = run({ ...values, tieRodInnerZ })
        fc.pre(result.ok)
        expect(result.ok && result.outputs.bumpSteer).toBeCloseTo(0, 9)
      }),
    )
  })

  it('steers the other way with the arm behind the axle', () => {
    fc.assert(
      fc.property(car, (values) => {
        const other = answered({ ...values, steeringArm: -values.steeringArm }).outputs
        expect(other.bumpSteer).toBeCloseTo(-answered(values).outputs.bumpSteer, 12)
        expect(posesOf({ ...values, steeringArm: -values.steeringArm }).map(({ toe }) => -toe)).toEqual(
          posesOf(values)
            .map(({ toe }) => toe)
            .map((toe) => expect.closeTo(toe, 9)),
        )
      }),
      { numRuns: 20 },
    )
  })

  it('moves with parallel arms: no camber at that moment, the roll centre from the slope, the centre far away', () => {
    fc.assert(
      fc.property(near(0, 0.2), near(-60, 10), (slope, length) => {
        const values = {
          lowerInnerZ: 30,
          lowerOuterZ: 30 + slope * 80,
          upperInnerY: 100 + length,
          upperInnerZ: 66 + slope * length,
          upperOuterZ: 66,
          travelUp: 5,
          travelDown: 5,
        }
        const { outputs, warnings } = answered(values)
        expect(outputs.camberGain).toBeCloseTo(0, 9)
        expect(outputs.rollCentreHeight).toBeCloseTo(-slope * 127.5, 6)
        expect(Math.abs(outputs.instantCentreY)).toBeGreaterThan(1e8)
        expect(warnings.map(({ field }) => field)).toContain('upperInnerZ')
      }),
    )
    const { inputs, outputs } = answered({ upperInnerZ: 68, upperOuterZ: 68, lowerInnerZ: 28 })
    const { says, more } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe(
      'The roll centre stands 0\u00A0mm above the ground, and at ride height camber stays as it is over a bump.',
    )
    expect(plainSentence(more[0] ?? [])).toContain('The two arms are parallel, so their lines never meet.')
  })

  it('binds just where it says: that travel has an answer, a tenth more has none', () => {
    for (const key of ['travelUp', 'travelDown'] as const) {
      const at = Number(/binds at ([\d.]+)/.exec(refused({ [key]: 150 })[0] ?? '')?.[1])
      expect(run({ [key]: at }).ok).toBe(true)
      expect(run({ [key]: at + 0.1 }).ok).toBe(false)
    }
  })

  it('moves the tyre’s contact square to its line to the instant centre', () => {
    fc.assert(
      fc.property(car, (values) => {
        const linkage = linkageFrom(values)
        const motion = motionOf(linkage)
        const [sideways, upwards] = velocityOf(motion, linkage.contact)
        expect(upwards).toBeCloseTo(1, 12)
        const [y, z] = [motion.X - motion.W * linkage.contact[0], motion.Y]
        expect(sideways * y + upwards * z).toBeCloseTo(0, 9)
      }),
    )
  })
})
