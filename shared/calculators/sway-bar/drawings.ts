export { barFromAbove, barPushed }

import { roundedUp } from '../common/plot-window.ts'
import { figure, say } from '../sentence.ts'
import { barCompliance, type BarValues } from './bar.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'

type Inputs = BarValues & { comparisonDiameter: number }

/** The bar from above, both arms pointing down the picture, as thick as it is. */
function barFromAbove({ diameter, middleLength, armLength }: Inputs): DrawingSpec {
  const [half, r] = [middleLength / 2, diameter / 2]
  // Grows in steps, so that the bar is seen to change and not the picture.
  const wide = Math.max(roundedUp(half * 1.15 + diameter), roundedUp(armLength * 1.2))
  const top = Math.max(wide * 0.3, diameter * 1.5)
  const bottom = -roundedUp(armLength * 1.25)
  const outline: DrawingPoint[] = [
    [-half - r, -armLength],
    [-half - r, r],
    [half + r, r],
    [half + r, -armLength],
    [half - r, -armLength],
    [half - r, -r],
    [-half + r, -r],
    [-half + r, -armLength],
  ]
  const bearing = (x: number): DrawingShape[] => [
    {
      kind: 'line',
      points: [
        [x - r * 2, -r * 2.4],
        [x - r * 2, r * 2.4],
        [x + r * 2, r * 2.4],
        [x + r * 2, -r * 2.4],
      ],
      style: 'frame',
      closed: true,
    },
  ]
  return {
    caption: 'The bar from above, to scale: bearings at the bends, links at the ends.',
    alternative: say`A U-shaped bar from above: a straight middle of ${figure(middleLength, 'mm', 4)} held in two bearings, and at each end an arm of ${figure(armLength, 'mm', 4)}, square to it. The bar is ${figure(diameter, 'mm', 4)} thick.`,
    unit: 'mm',
    frame: { left: -wide, right: wide, bottom, top },
    shapes: [
      ...bearing(-half * 0.94),
      ...bearing(half * 0.94),
      { kind: 'line', points: outline, style: 'part', closed: true },
      { kind: 'point', at: [-half, -armLength], style: 'own' },
      { kind: 'point', at: [half, -armLength], style: 'own' },
      {
        kind: 'dimension',
        from: [-half, r],
        to: [half, r],
        offset: top * 0.45,
        label: say`middle ${figure(middleLength, 'mm', 4)}`,
      },
      {
        kind: 'dimension',
        from: [-half + r, -armLength],
        to: [-half + r, 0],
        offset: -wide * 0.3,
        label: say`arm ${figure(armLength, 'mm', 4)}`,
      },
    ],
  }
}

/**
 * Both bars seen along their middle under the same force: the one that bends this bar's ends a sixth of the
 * arm. The arms are drawn as they really bend.
 */
function barPushed(inputs: Inputs): DrawingSpec {
  const { armLength, diameter, comparisonDiameter } = inputs
  const { twist, bending } = barCompliance(inputs)
  const moved = armLength / 6
  const force = moved / (twist + bending)
  const other = moved * (diameter / comparisonDiameter) ** 4
  // Past its own length an end would swing round; such a bar is far too thin for this force, so it is left out.
  const showsOther = other < armLength
  const reach = roundedUp(armLength * 1.2)
  const push = reach * 0.18
  const high = Math.max(moved, showsOther ? other : 0) + push + reach * 0.14
  const word = say`${figure(force, 'N')}`
  const arm = (end: number, way: 1 | -1): DrawingPoint[] =>
    armShape(armLength, end, twist / (twist + bending)).map(([x, y]) => [x, way * y])
  return {
    caption:
      'Seen along the middle, to scale: the same push on your bar (heavy) and on the other (dashed). One end goes up, the other down.',
    alternative: showsOther
      ? say`Two arms seen from the end of the bar, one pushed up and one pulled down. ${figure(force, 'N')} moves each end of your ${figure(diameter, 'mm', 4)} bar by ${figure(moved, 'mm')}, and each end of the ${figure(comparisonDiameter, 'mm', 4)} bar by ${figure(other, 'mm')}.`
      : say`Two arms seen from the end of the bar, one pushed up and one pulled down. ${figure(force, 'N')} moves each end of your ${figure(diameter, 'mm', 4)} bar by ${figure(moved, 'mm')}; the ${figure(comparisonDiameter, 'mm', 4)} bar would give way altogether.`,
    unit: 'mm',
    frame: { left: -reach * 0.25, right: reach * 1.4, bottom: -high, top: high },
    shapes: [
      {
        kind: 'line',
        points: [
          [-reach * 0.1, 0],
          [armLength, 0],
        ],
        style: 'before',
      },
      ...(showsOther
        ? ([
            { kind: 'line', points: arm(other, 1), style: 'thought' },
            { kind: 'line', points: arm(other, -1), style: 'thought' },
          ] as const)
        : []),
      { kind: 'line', points: arm(moved, 1), style: 'own' },
      { kind: 'line', points: arm(moved, -1), style: 'own' },
      { kind: 'circle', at: [0, 0], radius: diameter / 2, style: 'part' },
      {
        kind: 'dimension',
        from: [armLength, 0],
        to: [armLength, moved],
        offset: -reach * 0.2,
        label: say`${figure(moved, 'mm')}`,
      },
      {
        kind: 'arrow',
        from: [armLength, moved + reach * 0.03],
        to: [armLength, moved + push],
        style: 'part',
      },
      {
        kind: 'arrow',
        from: [armLength, -moved - reach * 0.03],
        to: [armLength, -moved - push],
        style: 'part',
      },
      { kind: 'label', at: [armLength - reach * 0.04, moved + push], anchor: 'end', text: word },
      { kind: 'label', at: [armLength - reach * 0.04, -moved - push], anchor: 'end', text: word },
    ],
  }
}

/** An arm from its root to its end: the turned root makes it straight, the force makes it curve. */
function armShape(length: number, end: number, shareOfTwist: number): DrawingPoint[] {
  return Array.from({ length: 13 }, (_, index) => {
    const along = index / 12
    const curved = (along ** 2 * (3 - along)) / 2
    return [along * length, end * (shareOfTwist * along + (1 - shareOfTwist) * curved)]
  })
}
