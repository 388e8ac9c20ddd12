export { centreSteps }

import { degreesIn } from '../common/degrees.ts'
import { fenced, frac, math, row } from '../mathml.ts'
import { figure } from '../sentence.ts'
import { slopesAtRest } from './curves.ts'
import { m, mm, slope, slopeStep, y, z } from './formula-parts.ts'
import { linkageFrom, type LinkageInputs } from './linkage.ts'
import type { WorkingStep } from '../definition.ts'

/** Instant centre, roll centre and camber gain at ride height. */
function centreSteps(inputs: LinkageInputs): WorkingStep[] {
  const linkage = linkageFrom(inputs)
  const { lowerInner, lowerOuter, upperInner, upperOuter, contact } = linkage
  const { instantCentre, parallel, rollCentreHeight, camberGain } = slopesAtRest(linkage)
  // A slope cannot be written for an upright arm, and parallel lines have no crossing: the result stands alone.
  if (lowerInner[0] === lowerOuter[0] || upperInner[0] === upperOuter[0]) {
    return [
      {
        title: 'An arm stands upright, so the lines are cut without slopes. Roll centre',
        result: figure(rollCentreHeight, 'mm', 5),
      },
      { title: 'Camber gain', result: figure(camberGain, 'deg/mm', 5) },
    ]
  }
  const [lower, upper] = [slope(lowerInner, lowerOuter), slope(upperInner, upperOuter)]
  const slopes = [
    slopeStep('Slope of the lower arm', 'low', ['1', '2'], [lowerInner, lowerOuter]),
    slopeStep('Slope of the upper link', 'up', ['3', '4'], [upperInner, upperOuter]),
  ]
  if (parallel) {
    return [
      ...slopes,
      {
        title:
          'Both slopes are the same: the arms are parallel, and the roll centre lies on a line of that slope through the tyre',
        formula: math('h', '=', '−', m('low'), '×', y('c')),
        numbers: math('h', '=', '−', mm(lower), '×', mm(contact[0])),
        result: figure(rollCentreHeight, 'mm', 5),
      },
      {
        title: 'Camber gain: with parallel arms the upright does not turn',
        result: figure(camberGain, 'deg/mm', 5),
      },
    ]
  }
  const [ic, h] = [instantCentre, rollCentreHeight]
  return [
    ...slopes,
    {
      title: 'Instant centre, out: where the two lines meet',
      formula: math(
        y('IC'),
        '=',
        frac(
          row(z('1'), '−', m('low'), '×', y('1'), '−', z('3'), '+', m('up'), '×', y('3')),
          row(m('up'), '−', m('low')),
        ),
      ),
      numbers: math(
        y('IC'),
        '=',
        frac(
          row(
            mm(lowerInner[1]),
            '−',
            mm(lower),
            '×',
            mm(lowerInner[0]),
            '−',
            mm(upperInner[1]),
            '+',
            mm(upper),
            '×',
            mm(upperInner[0]),
          ),
          row(mm(upper), '−', mm(lower)),
        ),
      ),
      result: figure(ic[0], 'mm', 5),
    },
    {
      title: 'Instant centre, up: on the line of the lower arm',
      formula: math(z('IC'), '=', z('1'), '+', m('low'), '×', fenced(y('IC'), '−', y('1'))),
      numbers: math(
        z('IC'),
        '=',
        mm(lowerInner[1]),
        '+',
        mm(lower),
        '×',
        fenced(mm(ic[0]), '−', mm(lowerInner[0])),
      ),
      result: figure(ic[1], 'mm', 5),
    },
    {
      title: 'Roll centre: where the line from the tyre to the instant centre crosses the middle of the car',
      formula: math('h', '=', frac(row(z('IC'), '×', y('c')), row(y('c'), '−', y('IC')))),
      numbers: math('h', '=', frac(row(mm(ic[1]), '×', mm(contact[0])), row(mm(contact[0]), '−', mm(ic[0])))),
      result: figure(h, 'mm', 5),
    },
    {
      title: 'Camber gain: the upright turns about the instant centre',
      formula: math('γ′', '=', '−', frac(degreesIn(180), 'π'), '×', frac(1, row(y('c'), '−', y('IC')))),
      numbers: math(
        'γ′',
        '=',
        '−',
        frac(degreesIn(180), 'π'),
        '×',
        frac(1, row(mm(contact[0]), '−', mm(ic[0]))),
      ),
      result: figure(camberGain, 'deg/mm', 5),
    },
  ]
}
