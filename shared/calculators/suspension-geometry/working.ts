export { geometryWorking }

import { degreesIn } from '../common/degrees.ts'
import { frac, math, row, sub } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { poseAt, slopesAtRest, travelOf } from './curves.ts'
import { distance, m, mm, slope, slopeStep, y, z } from './formula-parts.ts'
import { linkageFrom, motionOf, velocityOf, type LinkageInputs, type Point } from './linkage.ts'
import { centreSteps } from './working-centre.ts'
import type { CalculatorSymbol, CalculatorWorking, WorkingStep } from '../definition.ts'

/** Index letters of the joints: lower and upper arm, tie rod; inner and outer end. */
const joints = [
  ['lowerInner', '1', 'lower arm, inner pin'],
  ['lowerOuter', '2', 'lower arm, outer pin'],
  ['upperInner', '3', 'upper link, inner end'],
  ['upperOuter', '4', 'upper link, outer end'],
  ['tieRodInner', '5', 'tie rod, inner end'],
  ['tieRodOuter', '6', 'tie rod, outer end'],
] as const

function geometryWorking(inputs: LinkageInputs): CalculatorWorking {
  return {
    symbols: symbolsOf(inputs),
    steps: [...centreSteps(inputs), ...toeSteps(inputs), ...travelSteps(inputs)],
  }
}

function symbolsOf(inputs: LinkageInputs): CalculatorSymbol[] {
  return [
    ...joints.map(([key, index, name]) => ({
      symbol: math(y(index), ',', z(index)),
      means: say`${name}: ${figure(inputs[`${key}Y`], 'mm', 5)} out, ${figure(inputs[`${key}Z`], 'mm', 5)} up`,
    })),
    {
      symbol: math(y('c')),
      means: say`middle of the tyre on the ground, ${figure(inputs.contactY, 'mm', 5)} out`,
    },
    { symbol: math('a'), means: say`steering arm, ${figure(inputs.steeringArm, 'mm', 5)}` },
  ]
}

/** Bump steer at ride height. */
function toeSteps(inputs: LinkageInputs): WorkingStep[] {
  const linkage = linkageFrom(inputs)
  const { tieRodInner, tieRodOuter } = linkage
  const [sideways, upwards] = velocityOf(motionOf(linkage), tieRodOuter)
  const rod = slope(tieRodInner, tieRodOuter)
  const { bumpSteer } = slopesAtRest(linkage)
  const [out, up] = [sub('v', 'out'), sub('v', 'up')]
  return [
    slopeStep('Slope of the tie rod', 'rod', ['5', '6'], [tieRodInner, tieRodOuter]),
    {
      title:
        'The tie rod’s outer end, carried by the upright: how far out and up it goes for each mm of rise',
      formula: math(
        out,
        '=',
        frac(row(z('IC'), '−', z('6')), row(y('c'), '−', y('IC'))),
        ',',
        up,
        '=',
        frac(row(y('6'), '−', y('IC')), row(y('c'), '−', y('IC'))),
      ),
      numbers: math(out, '=', mm(sideways), ',', up, '=', mm(upwards)),
    },
    {
      title:
        'Bump steer: the rod keeps its length, so it pulls the end sideways by the difference, on the steering arm',
      formula: math('δ′', '=', frac(degreesIn(180), 'π'), '×', frac(row(out, '+', m('rod'), '×', up), 'a')),
      numbers: math(
        'δ′',
        '=',
        frac(degreesIn(180), 'π'),
        '×',
        frac(row(mm(sideways), '+', mm(rod), '×', mm(upwards)), mm(inputs.steeringArm)),
      ),
      result: figure(bumpSteer, 'deg/mm', 5),
    },
  ]
}

/** Over the travel: the lengths that stay, and what solving for them gives at full bump. */
function travelSteps(inputs: LinkageInputs): WorkingStep[] {
  const linkage = linkageFrom(inputs)
  const travel = travelOf(linkage, inputs.travelUp, inputs.travelDown)
  const bump = poseAt(linkage, travel, inputs.travelUp)
  const length = (
    title: string,
    index: string,
    [from, to]: readonly [string, string],
    a: Point,
    b: Point,
  ): WorkingStep => ({
    title,
    formula: math(sub('l', index), '=', distance(y(from), z(from), y(to), z(to))),
    numbers: math(sub('l', index), '=', distance(mm(a[0]), mm(a[1]), mm(b[0]), mm(b[1]))),
    result: figure(Math.hypot(b[0] - a[0], b[1] - a[1]), 'mm', 5),
  })
  return [
    length(
      'Over the travel the linkage is solved. The lower arm keeps its length',
      'low',
      ['1', '2'],
      linkage.lowerInner,
      linkage.lowerOuter,
    ),
    length('So does the upper link', 'up', ['3', '4'], linkage.upperInner, linkage.upperOuter),
    length(
      'and the upright between the outer joints',
      'u',
      ['2', '4'],
      linkage.lowerOuter,
      linkage.upperOuter,
    ),
    {
      title:
        'At full bump the lower arm is turned until the tyre has risen that far; the outer joints that keep all three lengths are',
      numbers: math(
        y('2'),
        '=',
        mm(bump.lowerOuter[0]),
        ',',
        z('2'),
        '=',
        mm(bump.lowerOuter[1]),
        ',',
        y('4'),
        '=',
        mm(bump.upperOuter[0]),
        ',',
        z('4'),
        '=',
        mm(bump.upperOuter[1]),
      ),
      formula: math(
        distance(y('1'), z('1'), y('2'), z('2')),
        '=',
        sub('l', 'low'),
        ',',
        distance(y('3'), z('3'), y('4'), z('4')),
        '=',
        sub('l', 'up'),
        ',',
        distance(y('2'), z('2'), y('4'), z('4')),
        '=',
        sub('l', 'u'),
      ),
    },
    {
      title: 'Camber at full bump: how far the line through both joints has turned',
      result: figure(bump.camber, 'deg', 4),
    },
    {
      title: 'Toe at full bump: arcsine of the sideways pull over the steering arm',
      result: figure(bump.toe, 'deg', 4),
    },
  ]
}
