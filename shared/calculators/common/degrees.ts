export { arcsine, arctangent, cosine, degreesIn, sine, tangent }

import { num, row, type MathNode } from '../mathml.ts'

/** Trigonometry in degrees, the unit in which racers set and measure every angle. */
const radian = 180 / Math.PI

const sine = (degrees: number): number => Math.sin(degrees / radian)
const cosine = (degrees: number): number => Math.cos(degrees / radian)
const tangent = (degrees: number): number => Math.tan(degrees / radian)
const arcsine = (ratio: number): number => Math.asin(ratio) * radian
const arctangent = (ratio: number): number => Math.atan(ratio) * radian

/** An angle as it stands in a formula: 2°, and (−2°) fenced. */
function degreesIn(value: number, digits = 4): MathNode {
  const angle = row(num(Math.abs(value), digits), { tag: 'mtext', text: '°' })
  return value < 0 ? row('(', '−', angle, ')') : angle
}
