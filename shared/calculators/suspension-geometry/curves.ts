export { canMove, checkTravel, poseAt, posesOver, slopesAtRest, travelOf }
export type { Pose, Travel }

import { figure, say } from '../sentence.ts'
import { NoAnswerError } from '../run-definition.ts'
import { instantCentre, motionOf, velocityOf, type Linkage, type Point } from './linkage.ts'
import { fourBarOf, reachOf, uprightAt, type FourBar, type Reach, type Upright } from './travel.ts'

/** Everything about one place of the travel; camber and toe are changes from ride height, in degrees. */
interface Pose extends Upright {
  travel: number
  camber: number
  toe: number
  /** Roll centre above the ground, which is where the tyre stands. */
  rollCentre: number
  /** Both wheels, the other side moving alike. */
  track: number
}

interface Travel {
  bar: FourBar
  up: Reach
  down: Reach
}

const degrees = 180 / Math.PI
const intervals = 20

/** Whether the wheel can rise or fall from ride height at all. */
function canMove(linkage: Linkage): boolean {
  return Math.abs(motionOf(linkage).lever) > 1e-6
}

/** What the linkage does for each mm of wheel rise, at ride height. Camber top outward, toe-in positive; degrees. */
function slopesAtRest(linkage: Linkage): {
  instantCentre: Point
  parallel: boolean
  rollCentreHeight: number
  camberGain: number
  bumpSteer: number
} {
  if (!canMove(linkage)) {
    throw new NoAnswerError(
      'contactY',
      say`With these points the wheel cannot rise or fall: the instant centre stands straight above or below the tyre, or the two arms lie on one line.`,
    )
  }
  const motion = motionOf(linkage)
  const { at, parallel } = instantCentre(linkage, motion)
  const { tieRodInner: inner, tieRodOuter: outer } = linkage
  const [sideways, upwards] = velocityOf(motion, outer)
  const rodSlope = (outer[1] - inner[1]) / (outer[0] - inner[0])
  return {
    instantCentre: at,
    parallel,
    rollCentreHeight: rollCentreOf(linkage),
    camberGain: settled((-degrees * motion.W) / motion.lever),
    bumpSteer: settled((degrees * (sideways + rodSlope * upwards)) / linkage.steeringArm),
  }
}

/** How far the arms go, at most as far as asked for. */
function travelOf(linkage: Linkage, travelUp: number, travelDown: number): Travel {
  const bar = fourBarOf(linkage)
  return { bar, up: reachOf(bar, travelUp), down: reachOf(bar, -travelDown) }
}

/** Throws NoAnswerError, saying where it binds, when arms or tie rod do not go as far as asked for. */
function checkTravel(linkage: Linkage, travelUp: number, travelDown: number): void {
  const { bar, up, down } = travelOf(linkage, travelUp, travelDown)
  for (const [field, reach] of [
    ['travelUp', up],
    ['travelDown', down],
  ] as const) {
    const good = (at: number) => toeOf(linkage, uprightAt(bar, at, reach)) !== undefined
    const steps = Array.from({ length: intervals }, (_, index) => (reach.travel * (index + 1)) / intervals)
    // The rod first: it may give out before the arms do, and the nearer end is the one to name.
    const stop = steps.findIndex((at) => !good(at))
    if (stop >= 0) {
      throw binds(
        field,
        'tie rod',
        'it cannot reach the upright',
        lastGood(good, steps[stop - 1] ?? 0, steps[stop] ?? 0),
      )
    }
    if (reach.binds) throw binds(field, 'linkage', 'the arms cannot follow', reach.travel)
  }
}

/** One place of the travel; beyond either end it is that end. */
function poseAt(linkage: Linkage, { bar, up, down }: Travel, at: number): Pose {
  const travel = Math.min(up.travel, Math.max(down.travel, at))
  const upright = uprightAt(bar, travel, travel < 0 ? down : up)
  const moved = { ...linkage, ...upright }
  return {
    ...upright,
    travel,
    camber: settled(-upright.turned * degrees),
    toe: settled(toeOf(linkage, upright) ?? 0),
    rollCentre: rollCentreOf(moved),
    track: 2 * upright.contact[0],
  }
}

/** Poses from full droop to full bump, ride height among them. */
function posesOver(linkage: Linkage, travel: Travel): Pose[] {
  return Array.from({ length: 2 * intervals + 1 }, (_, index) => {
    const step = index - intervals
    const end = step < 0 ? -travel.down.travel : travel.up.travel
    return poseAt(linkage, travel, (end * step) / intervals)
  })
}

/** The line from contact to instant centre cuts the centre line here, counted from the contact point up. */
function rollCentreOf(linkage: Linkage): number {
  const [sideways] = velocityOf(motionOf(linkage), linkage.contact)
  return settled(sideways * linkage.contact[0])
}

/**
 * Toe in degrees: the tie rod's outer end moves sideways until the rod has its length again, and that turns the
 * upright by its steering arm. Undefined where the rod cannot reach, or the arm would turn past square.
 */
function toeOf({ tieRodInner, tieRodOuter, steeringArm }: Linkage, upright: Upright): number | undefined {
  const [y, z] = upright.tieRodOuter
  const length = Math.hypot(tieRodOuter[0] - tieRodInner[0], tieRodOuter[1] - tieRodInner[1])
  const across = length ** 2 - (z - tieRodInner[1]) ** 2
  if (across < 0) return undefined
  const side = Math.sign(tieRodOuter[0] - tieRodInner[0])
  const ratio = (y - tieRodInner[0] - side * Math.sqrt(across)) / steeringArm
  return Math.abs(ratio) > 1 ? undefined : Math.asin(ratio) * degrees
}

/** Rounding leaves 10⁻¹⁵ where the answer is none: at ride height, and with parallel arms. */
function settled(value: number): number {
  return Math.abs(value) < 1e-12 ? 0 : value
}

function lastGood(good: (at: number) => boolean, inside: number, outside: number): number {
  for (let round = 0; round < 40; round += 1) {
    const middle = (inside + outside) / 2
    if (good(middle)) inside = middle
    else outside = middle
  }
  return inside
}

function binds(field: 'travelUp' | 'travelDown', what: string, why: string, at: number): NoAnswerError {
  // Rounded towards ride height, so that the number said is one that works.
  const safe = Math.floor(Math.abs(at) * 10) / 10
  return new NoAnswerError(
    field,
    say`The ${what} binds at ${figure(safe, 'mm', 4)} of travel ${field === 'travelUp' ? 'up' : 'down'}: beyond that ${why}. Ask for less travel, or move a point.`,
  )
}
