export { travelDrawings }

import { figure, say, type Sentence } from '../sentence.ts'
import { poseAt, travelOf, type Pose } from './curves.ts'
import { clipped, inside, mirrored, sideShapes, tyreRadius, type Frame } from './front-view.ts'
import {
  instantCentre,
  linkageFrom,
  motionOf,
  type Linkage,
  type LinkageInputs,
  type Point,
} from './linkage.ts'
import { meeting } from './words.ts'
import type { DrawingHandle, DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'

interface Scene {
  /** At ride height, as entered. */
  rest: Linkage
  /** Where the cursor stands, the chassis held still: the ground comes up with the wheel. */
  moved: Linkage
  pose: Pose
  radius: number
  centre: Point
  parallel: boolean
  rollCentre: DrawingPoint
}

const handles = [
  ['lowerInner', 'Lower arm, inner pin'],
  ['lowerOuter', 'Lower arm, outer pin'],
  ['upperInner', 'Upper link, inner end'],
  ['upperOuter', 'Upper link, outer end'],
  ['tieRodInner', 'Tie rod, inner end'],
  ['tieRodOuter', 'Tie rod, outer end'],
] as const

/** One side large enough to take hold of its joints, and the whole axle with the place where the lines meet. */
function travelDrawings(inputs: LinkageInputs, at: number): DrawingSpec[] {
  const rest = linkageFrom(inputs)
  const pose = poseAt(rest, travelOf(rest, inputs.travelUp, inputs.travelDown), at)
  const moved = { ...rest, ...pose }
  const { at: centre, parallel } = instantCentre(moved, motionOf(moved))
  const scene: Scene = {
    rest,
    moved,
    pose,
    parallel,
    centre,
    radius: tyreRadius(rest),
    rollCentre: [0, pose.contact[1] + pose.rollCentre],
  }
  return [closeUp(scene, inputs), wholeAxle(scene, inputs)]
}

function closeUp(scene: Scene, { travelUp, travelDown }: LinkageInputs): DrawingSpec {
  const { rest, moved, pose, radius, rollCentre } = scene
  const joints = handles.map(([key]) => rest[key])
  const frame = steppedFrame(10, {
    left: Math.min(-20, ...joints.map(([y]) => y - 8)),
    right: Math.max(rest.contact[0] + 0.36 * radius + 8, ...joints.map(([y]) => y + 8)),
    bottom: Math.min(-travelDown - 5, ...joints.map(([, z]) => z - 8)),
    top: Math.max(2 * radius + travelUp + 6, ...joints.map(([, z]) => z + 40)),
  })
  const label = (up: number, text: Sentence): DrawingShape => ({
    kind: 'label',
    at: [4, up],
    anchor: 'start',
    text,
  })
  return {
    caption: `One side from the front, to scale. ${pose.travel === 0 ? 'Take hold of a joint to move it.' : 'Dotted: the arms at ride height.'} Only the tyre’s outline is guessed: its size is not asked for.`,
    alternative: alternativeOf(scene),
    unit: 'mm',
    frame,
    shapes: [
      ground(frame, pose.contact[1]),
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, frame.bottom],
          [0, frame.top],
        ],
      },
      ...(pose.travel === 0 ? [] : ghost(rest)),
      ...construction(scene, frame),
      ...sideShapes(moved, { turned: pose.turned, radius }),
      ...handles.map(([key]): DrawingShape => ({ kind: 'point', at: moved[key], style: 'part' })),
      ...(inside(rollCentre, frame) ? [{ kind: 'point', at: rollCentre, style: 'own' } as const] : []),
      {
        kind: 'label',
        at: [4, besideRollCentre(scene, frame)],
        anchor: 'start',
        text: say`roll centre ${figure(pose.rollCentre, 'mm')}`,
        style: 'own',
      },
      label(frame.top - 5, wheelInWords(pose.travel)),
      label(frame.top - 14, say`camber ${figure(pose.camber, 'deg', 2)}`),
      label(frame.top - 23, say`toe ${figure(pose.toe, 'deg', 2)}`),
    ],
    handles: [
      ...handles.map(([key, name]): DrawingHandle => ({
        at: rest[key],
        label: `${name}, at ride height`,
        x: `${key}Y`,
        y: `${key}Z`,
      })),
      { at: rest.contact, label: 'Middle of the tyre on the ground, at ride height', x: 'contactY' },
    ],
  }
}

function wholeAxle(scene: Scene, inputs: LinkageInputs): DrawingSpec {
  const { rest, moved, pose, radius, centre, parallel, rollCentre } = scene
  // The picture is laid out for ride height, so that it stands still while the cursor moves.
  const still = instantCentre(rest, motionOf(rest)).at
  const half = rest.contact[0] + 0.36 * radius + 10
  const shown = Math.abs(still[0]) < 4 * rest.contact[0] && Math.abs(still[1]) < 2 * rest.contact[0]
  const frame = steppedFrame(20, {
    left: Math.min(-half, shown ? still[0] - 30 : -half),
    right: Math.max(half, shown ? still[0] + 30 : half),
    bottom: Math.min(-inputs.travelDown - 36, shown ? still[1] - 20 : 0),
    top: Math.max(2 * radius + inputs.travelUp + 5, shown ? still[1] + 20 : 0),
  })
  /** A line of words in this picture, in mm. */
  const high = (frame.right - frame.left) / 20
  return {
    caption:
      'The whole axle from the front, to scale: the arms’ lines meet in the instant centre, and the line from there to the tyre crosses the middle of the car in the roll centre.',
    alternative: alternativeOf(scene),
    unit: 'mm',
    frame,
    shapes: [
      ground(frame, pose.contact[1]),
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, frame.bottom],
          [0, frame.top],
        ],
      },
      ...construction(scene, frame),
      ...sideShapes(mirrored(moved), { turned: -pose.turned, radius }, 'frame'),
      ...sideShapes(moved, { turned: pose.turned, radius }),
      ...(inside(rollCentre, frame) ? [{ kind: 'point', at: rollCentre, style: 'own' } as const] : []),
      ...(inside(centre, frame)
        ? ([
            { kind: 'point', at: centre, style: 'thought' },
            { kind: 'label', at: [centre[0], centre[1] + high], anchor: 'middle', text: say`instant centre` },
          ] as const)
        : ([
            {
              kind: 'label',
              at: [frame.left + high / 2, frame.top - high / 2],
              anchor: 'start',
              text: parallel
                ? say`parallel arms never meet`
                : say`lines meet ${figure(Math.hypot(...centre), 'mm')} away`,
            },
          ] as const)),
      {
        kind: 'label',
        at: [0, frame.bottom + high / 3],
        anchor: 'middle',
        text: say`roll centre ${figure(pose.rollCentre, 'mm')}`,
        style: 'own',
      },
    ],
  }
}

/** Clear of the line to the tyre: above a roll centre above the ground, below one under it, always in the picture. */
function besideRollCentre({ pose, rollCentre }: Scene, { bottom, top }: Frame): number {
  const beside = rollCentre[1] + (pose.rollCentre < 3 ? -9 : 5)
  return Math.max(bottom + 4, Math.min(top - 32, beside))
}

/** The lines of the arms run on to the instant centre, and the line from the tyre through both centres. */
function construction({ moved, centre, rollCentre }: Scene, frame: Frame): DrawingShape[] {
  const { lowerInner, lowerOuter, upperInner, upperOuter, contact } = moved
  const nearer = (one: Point, other: Point) =>
    Math.hypot(one[0] - centre[0], one[1] - centre[1]) <
    Math.hypot(other[0] - centre[0], other[1] - centre[1])
      ? one
      : other
  const beyond = contact[0] > 0 && centre[0] > contact[0] ? contact : rollCentre
  return [
    ...clipped(nearer(lowerInner, lowerOuter), centre, frame, 'thought'),
    ...clipped(nearer(upperInner, upperOuter), centre, frame, 'thought'),
    ...clipped(contact, rollCentre, frame, 'own'),
    ...clipped(beyond, centre, frame, 'thought'),
  ]
}

/** Arms and upright at ride height, while the cursor stands elsewhere. */
function ghost({ lowerInner, lowerOuter, upperInner, upperOuter }: Linkage): DrawingShape[] {
  return [{ kind: 'line', style: 'before', points: [lowerInner, lowerOuter, upperOuter, upperInner] }]
}

function ground({ left, right }: Frame, height: number): DrawingShape {
  return {
    kind: 'line',
    style: 'ground',
    points: [
      [left, height],
      [right, height],
    ],
  }
}

function steppedFrame(step: number, { left, right, bottom, top }: Frame): Frame {
  const down = (value: number) => step * Math.floor(value / step)
  const up = (value: number) => step * Math.ceil(value / step)
  return { left: down(left), right: up(right), bottom: down(bottom), top: up(top) }
}

function wheelInWords(travel: number): Sentence {
  if (travel === 0) return say`at ride height`
  return say`wheel ${figure(Math.abs(travel), 'mm')} ${travel > 0 ? 'up' : 'down'}`
}

function alternativeOf({ pose, parallel, centre }: Scene): Sentence {
  return [
    'The suspension seen from the front, ',
    ...wheelInWords(pose.travel),
    ...say`. Camber ${figure(pose.camber, 'deg', 2)}, toe ${figure(pose.toe, 'deg', 2)} from ride height. `,
    ...meeting(centre, parallel),
    ...say`The roll centre stands ${figure(Math.abs(pose.rollCentre), 'mm')} ${pose.rollCentre < 0 ? 'below' : 'above'} the ground.`,
  ]
}
