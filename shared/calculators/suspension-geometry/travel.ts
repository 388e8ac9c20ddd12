export { fourBarOf, reachOf, uprightAt }
export type { FourBar, Reach, Upright }

import type { Linkage, Point } from './linkage.ts'

/** The upright somewhere in its travel, the chassis held still. */
interface Upright {
  lowerOuter: Point
  upperOuter: Point
  contact: Point
  /** Where the upright alone would carry the tie rod's outer end. */
  tieRodOuter: Point
  /** How far the upright has turned, anticlockwise, in radians. */
  turned: number
}

/** How far a linkage can go one way: up to `travel` mm, with the lower arm at `angle`; `binds` where it ends there. */
interface Reach {
  angle: number
  travel: number
  binds: boolean
}

interface Placed extends Upright {
  /** How far the contact point has risen. */
  rise: number
  /** Turn of the lower arm for each mm of rise, in radians; changes its sign where the linkage binds. */
  arm: number
}

/** The linkage as a mechanism driven by the angle of its lower arm. */
interface FourBar {
  atRest: Upright
  /** Angle of the lower arm at ride height, in radians. */
  rest: number
  /** Undefined where upper link and upright do not reach each other. */
  place(angle: number): Placed | undefined
}

/** Fine enough that no arm passes a dead point between two steps and comes back. */
const stride = Math.PI / 180

/** How far up (`wanted` > 0) or down the linkage reaches, at most `wanted` mm of rise of the contact point. */
function reachOf({ rest, place }: FourBar, wanted: number): Reach {
  const start = place(rest)
  if (start === undefined) return { angle: rest, travel: 0, binds: true }
  const way = Math.sign(start.arm * wanted)
  const good = (angle: number) => {
    const placed = place(angle)
    return placed !== undefined && placed.arm * start.arm > 0 ? placed : undefined
  }
  let [last, travel] = [rest, 0]
  for (let turned = stride; turned <= Math.PI; turned += stride) {
    const angle = rest + way * turned
    const placed = good(angle)
    if (placed === undefined) return deadPoint(good, last, angle, wanted, travel)
    ;[last, travel] = [angle, placed.rise]
    if (Math.abs(travel) >= Math.abs(wanted)) return { angle, travel: wanted, binds: false }
  }
  return { angle: last, travel, binds: true }
}

/**
 * The upright when the contact point has risen by `travel` mm (down is negative), which `reach` must allow. The
 * four-bar linkage is solved, not linearised: Newton's method on the angle of the lower arm, kept between its
 * angle at rest and that of the reach.
 */
function uprightAt({ rest, atRest, place }: FourBar, travel: number, reach: Reach): Upright {
  if (travel === 0) return atRest
  let [near, far] = [rest, reach.angle]
  let angle = rest + (far - rest) * (travel / reach.travel)
  for (let round = 0; round < 60; round += 1) {
    const placed = place(angle)
    const missing = placed === undefined ? NaN : travel - placed.rise
    if (placed !== undefined && Math.abs(missing) < 1e-11) return placed
    // Too far, or off the end: the far bracket comes nearer. Else the near one moves out.
    if (placed === undefined || missing * Math.sign(travel) < 0) far = angle
    else near = angle
    const newton = placed === undefined ? NaN : angle + placed.arm * missing
    angle = (newton - near) * (newton - far) <= 0 ? newton : (near + far) / 2
  }
  return place(near) ?? atRest
}

/** Narrows the place where the linkage stops: `last` is good, `bad` is not. */
function deadPoint(
  good: (angle: number) => Placed | undefined,
  last: number,
  bad: number,
  wanted: number,
  reached: number,
): Reach {
  let [inside, outside, travel] = [last, bad, reached]
  for (let round = 0; round < 50; round += 1) {
    const middle = (inside + outside) / 2
    const placed = good(middle)
    if (placed === undefined) outside = middle
    else [inside, travel] = [middle, placed.rise]
    if (Math.abs(travel) >= Math.abs(wanted)) return { angle: inside, travel: wanted, binds: false }
  }
  return { angle: inside, travel, binds: true }
}

/** Lengths and angles that stay are taken once: a pointer that drags a joint asks for hundreds of places a second. */
function fourBarOf(linkage: Linkage): FourBar {
  const { lowerInner, upperInner, contact, tieRodOuter } = linkage
  const arm = minus(linkage.lowerOuter, lowerInner)
  const upright = minus(linkage.upperOuter, linkage.lowerOuter)
  const armLength = length(arm)
  const uprightLength = length(upright)
  const upperLength = length(minus(linkage.upperOuter, upperInner))
  const side = Math.sign(cross(minus(upperInner, linkage.lowerOuter), upright))
  const toContact = minus(contact, linkage.lowerOuter)
  const toTieRod = minus(tieRodOuter, linkage.lowerOuter)

  /** Two circles meet in the upper joint: one about the lower joint, one about the upper link's inner end. */
  function place(angle: number): Placed | undefined {
    const forward: Point = [Math.cos(angle), Math.sin(angle)]
    const lowerOuter: Point = [lowerInner[0] + armLength * forward[0], lowerInner[1] + armLength * forward[1]]
    const toUpper = minus(upperInner, lowerOuter)
    const distance = length(toUpper)
    const along = (distance ** 2 + uprightLength ** 2 - upperLength ** 2) / (2 * distance)
    const square = uprightLength ** 2 - along ** 2
    // Not <: written this way a distance of 0 (along is not a number) is turned away too.
    if (!(square >= 0)) return undefined
    const across = side * Math.sqrt(square)
    const [uy, uz] = [toUpper[0] / distance, toUpper[1] / distance]
    const now: Point = [along * uy - across * uz, along * uz + across * uy]
    const cosine = dot(upright, now) / uprightLength ** 2
    const sine = cross(upright, now) / uprightLength ** 2
    const carried = ([y, z]: Point): Point => [
      lowerOuter[0] + y * cosine - z * sine,
      lowerOuter[1] + y * sine + z * cosine,
    ]
    const upperOuter: Point = [lowerOuter[0] + now[0], lowerOuter[1] + now[1]]
    const moved = carried(toContact)
    // The upper joint can only move square to its link: that ties the upright's turning to the arm's.
    const link = minus(upperOuter, upperInner)
    const turning = (-armLength * cross(link, forward)) / cross(link, now)
    const rising = armLength * forward[0] + turning * (moved[0] - lowerOuter[0])
    return {
      lowerOuter,
      upperOuter,
      contact: moved,
      tieRodOuter: carried(toTieRod),
      turned: Math.atan2(sine, cosine),
      rise: moved[1] - contact[1],
      arm: 1 / rising,
    }
  }

  const atRest = {
    lowerOuter: linkage.lowerOuter,
    upperOuter: linkage.upperOuter,
    contact,
    tieRodOuter,
    turned: 0,
  }
  return { rest: Math.atan2(arm[1], arm[0]), atRest, place }
}

function minus(one: Point, other: Point): Point {
  return [one[0] - other[0], one[1] - other[1]]
}

// Math.hypot guards against numbers that no car has, and is many times slower.
function length([y, z]: Point): number {
  return Math.sqrt(y * y + z * z)
}

function dot(one: Point, other: Point): number {
  return one[0] * other[0] + one[1] * other[1]
}

function cross(one: Point, other: Point): number {
  return one[0] * other[1] - one[1] * other[0]
}
