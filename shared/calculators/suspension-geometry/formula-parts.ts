export { distance, m, mm, over, slope, slopeStep, y, z }

import { fenced, frac, num, power, root, row, sub, math, type MathPart } from '../mathml.ts'
import { figure } from '../sentence.ts'
import type { WorkingStep } from '../definition.ts'
import type { Point } from './linkage.ts'

/** Coordinates of the joint with this index, slope of the line with this name. */
const y = (index: string) => sub('y', index)
const z = (index: string) => sub('z', index)
const m = (index: string) => sub('m', index)
const mm = (value: number) => num(value, 5)
const over = (one: MathPart, other: MathPart, three: MathPart, four: MathPart) =>
  frac(row(one, '−', other), row(three, '−', four))

/** The slope of a line from its inner to its outer end, and the same in numbers. */
function slopeStep(
  title: string,
  name: string,
  [from, to]: readonly [string, string],
  [a, b]: readonly [Point, Point],
): WorkingStep {
  return {
    title,
    formula: math(m(name), '=', over(z(to), z(from), y(to), y(from))),
    numbers: math(m(name), '=', over(mm(b[1]), mm(a[1]), mm(b[0]), mm(a[0]))),
    result: figure(slope(a, b), '1', 5),
  }
}

function slope(a: Point, b: Point): number {
  return (b[1] - a[1]) / (b[0] - a[0])
}

/** Between two points, as a root of squares. */
function distance(y1: MathPart, z1: MathPart, y2: MathPart, z2: MathPart) {
  return root(power(fenced(y2, '−', y1), 2), '+', power(fenced(z2, '−', z1), 2))
}
