export { answerOf, comparisonOf, meeting, travelTable }

import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { canMove, poseAt, slopesAtRest, travelOf } from './curves.ts'
import { linkageFrom, type LinkageInputs } from './linkage.ts'
import type { CalculatorAnswer, CalculatorComparison, CalculatorTable } from '../definition.ts'

/** Slopes smaller than this, in degrees for each mm, nobody can measure. */
const unnoticed = 0.0005
/** How far the comparison moves the upper link's inner end: one usual row of holes (common practice). */
const holeStep = 2

function answerOf(inputs: LinkageInputs): CalculatorAnswer {
  const linkage = linkageFrom(inputs)
  const { rollCentreHeight, camberGain, bumpSteer, instantCentre, parallel } = slopesAtRest(linkage)
  const travel = travelOf(linkage, inputs.travelUp, inputs.travelDown)
  const [low, high] = [poseAt(linkage, travel, -inputs.travelDown), poseAt(linkage, travel, inputs.travelUp)]
  return {
    says: [
      ...say`The roll centre stands ${mainFigure(Math.abs(rollCentreHeight), 'mm')} ${rollCentreHeight < 0 ? 'below' : 'above'} the ground, and `,
      ...camberInWords(camberGain),
    ],
    more: [
      [...meeting(instantCentre, parallel), ...toeInWords(bumpSteer)],
      say`From full droop to full bump, camber runs from ${figure(low.camber, 'deg', 2)} to ${figure(high.camber, 'deg', 2)}, toe from ${figure(low.toe, 'deg', 2)} to ${figure(high.toe, 'deg', 2)}, counted from ride height.`,
      say`On the way the roll centre goes from ${figure(low.rollCentre, 'mm')} to ${figure(high.rollCentre, 'mm')}, ${Math.min(low.rollCentre, high.rollCentre) < 0 ? 'minus meaning below the ground' : 'from the ground up'}.`,
    ],
  }
}

function camberInWords(gain: number): Sentence {
  if (Math.abs(gain) < unnoticed) return say`at ride height camber stays as it is over a bump.`
  return say`the top of the wheel tips ${gain < 0 ? 'in' : 'out'} by ${figure(Math.abs(gain), 'deg/mm', 2)} of bump.`
}

/** Where the instant centre lies; ends with a space, because a sentence follows. */
function meeting([y, z]: readonly [number, number], parallel: boolean): Sentence {
  if (parallel) return say`The two arms are parallel, so their lines never meet. `
  const side = y < 0 ? 'past' : 'out from'
  return say`The lines of the arms meet ${figure(Math.abs(y), 'mm')} ${side} the centre line, ${figure(Math.abs(z), 'mm')} ${z < 0 ? 'below' : 'above'} the ground. `
}

function toeInWords(bumpSteer: number): Sentence {
  if (Math.abs(bumpSteer) < unnoticed) return say`At ride height the wheel does not steer over a bump.`
  return say`The wheel steers towards ${bumpSteer < 0 ? 'toe-out' : 'toe-in'} by ${figure(Math.abs(bumpSteer), 'deg/mm', 2)} of bump.`
}

/** What the next hole up for the upper link would do, at ride height. */
function comparisonOf(inputs: LinkageInputs): CalculatorComparison {
  const now = slopesAtRest(linkageFrom(inputs))
  // A hole that leaves the wheel stuck has no slopes; the hole below it has.
  const { then, step } = slopesWith(inputs, holeStep) ??
    slopesWith(inputs, -holeStep) ?? { then: now, step: 0 }
  const change = then.rollCentreHeight - now.rollCentreHeight
  const height = figure(Math.abs(step), 'mm')
  return {
    says:
      Math.abs(change) < 0.005
        ? say`Moving the upper link’s inner end by ${height} leaves the roll centre where it is.`
        : say`${height} ${step < 0 ? 'lower' : 'higher'} at the upper link’s inner end ${change > 0 ? 'raises' : 'lowers'} the roll centre by ${figure(Math.abs(change), 'mm', 2)}.`,
    caption: 'If you move the upper link’s inner end to the next hole',
    columns: ['As it is', step < 0 ? 'Next hole down' : 'Next hole up'],
    rows: [
      {
        label: say`Inner end, up`,
        unit: 'mm',
        digits: 4,
        cells: [inputs.upperInnerZ, inputs.upperInnerZ + step],
      },
      {
        label: say`Roll centre`,
        unit: 'mm',
        digits: 3,
        cells: [now.rollCentreHeight, then.rollCentreHeight],
      },
      { label: say`Camber gain`, unit: 'deg/mm', digits: 3, cells: [now.camberGain, then.camberGain] },
      { label: say`Bump steer`, unit: 'deg/mm', digits: 3, cells: [now.bumpSteer, then.bumpSteer] },
    ],
  }
}

function slopesWith(inputs: LinkageInputs, step: number) {
  const raised = linkageFrom({ ...inputs, upperInnerZ: inputs.upperInnerZ + step })
  return canMove(raised) ? { then: slopesAtRest(raised), step } : undefined
}

/** Five places of the travel in numbers. */
function travelTable(inputs: LinkageInputs): CalculatorTable {
  const linkage = linkageFrom(inputs)
  const travel = travelOf(linkage, inputs.travelUp, inputs.travelDown)
  const { travelUp, travelDown } = inputs
  const poses = [-travelDown, -travelDown / 2, 0, travelUp / 2, travelUp].map((at) =>
    poseAt(linkage, travel, at),
  )
  const row = (
    label: Sentence,
    unit: 'mm' | 'deg',
    digits: number,
    key: 'travel' | 'camber' | 'toe' | 'rollCentre' | 'track',
  ) => ({
    label,
    unit,
    digits,
    cells: poses.map((pose) => pose[key]),
  })
  return {
    caption: 'Over the travel, angles from ride height',
    columns: ['Full droop', 'Half', 'Ride height', 'Half', 'Full bump'],
    rows: [
      row(say`Wheel`, 'mm', 3, 'travel'),
      row(say`Camber`, 'deg', 3, 'camber'),
      row(say`Toe`, 'deg', 3, 'toe'),
      row(say`Roll centre`, 'mm', 3, 'rollCentre'),
      row(say`Track`, 'mm', 4, 'track'),
    ],
  }
}
