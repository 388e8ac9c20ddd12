export { inputs, relationsOf, warningsAbout }

import { figure, say, type Sentence } from '../sentence.ts'
import type { CalculatorInput, FieldMessage } from '../definition.ts'
import type { LinkageInputs } from './linkage.ts'

/** Shorter than this two ends are one point, and have no direction. */
const shortest = 1

type JointName = 'LowerInner' | 'LowerOuter' | 'UpperInner' | 'UpperOuter' | 'TieRodInner' | 'TieRodOuter'

const joint = <const Name extends JointName>(
  name: Name,
  label: string,
  [y, z]: readonly [number, number],
): CalculatorInput<`${Uncapitalize<Name>}Y` | `${Uncapitalize<Name>}Z`>[] => {
  const first = name.charAt(0).toLowerCase()
  const key = <Axis extends 'Y' | 'Z'>(axis: Axis) =>
    `${first}${name.slice(1)}${axis}` as `${Uncapitalize<Name>}${Axis}`
  const common = { unit: 'mm', min: -200, max: 1000, step: 1 } as const
  const carKeys = (axis: 'Y' | 'Z') => ({ front: `front${name}${axis}`, rear: `rear${name}${axis}` }) as const
  return [
    {
      ...common,
      key: key('Y'),
      label: `${label}: out`,
      default: y,
      carKey: carKeys('Y'),
      reason: 'that is the range from the smallest model to a full-size car',
      help: 'Sideways from the middle of the car to the middle of the pin or ball, at ride height.',
    },
    {
      ...common,
      key: key('Z'),
      label: `${label}: up`,
      default: z,
      carKey: carKeys('Z'),
      reason: 'that is the range from the smallest model to a full-size car',
      help: 'From the ground to the middle of the pin or ball, at ride height.',
    },
  ]
}

const travel = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'mm',
  default: standard,
  min: 1,
  max: 300,
  step: 1,
  reason: 'the curves need some travel to run over, and no such car has more',
})

const inputs = [
  ...joint('LowerInner', 'Lower arm, inner pin', [25, 30]),
  ...joint('LowerOuter', 'Lower arm, outer pin', [105, 28]),
  ...joint('UpperInner', 'Upper link, inner end', [40, 62]),
  ...joint('UpperOuter', 'Upper link, outer end', [100, 66]),
  {
    key: 'contactY',
    label: 'Middle of the tyre: out',
    unit: 'mm',
    default: 127.5,
    min: 5,
    max: 1000,
    step: 0.5,
    reason: 'that is half the track, from the smallest model to a full-size car',
    help: 'Half the track: from the middle of the car to the middle of the tyre on the ground.',
    carKey: { front: 'frontContactY', rear: 'rearContactY' },
  },
  ...joint('TieRodInner', 'Tie rod, inner end', [30, 45]),
  ...joint('TieRodOuter', 'Tie rod, outer end', [102, 44]),
  {
    key: 'steeringArm',
    label: 'Steering arm',
    unit: 'mm',
    default: 20,
    min: -300,
    max: 300,
    step: 1,
    reason: 'no hub has a longer one',
    help: 'Along the car from the steering axis to the rod’s outer end. In front of the axle counts plus, behind it minus.',
  },
  travel('travelUp', 'Travel up', 25, 'How far the wheel rises from ride height until something stops it.'),
  travel('travelDown', 'Travel down', 20, 'How far it falls from ride height to the droop stop.'),
] as const satisfies readonly CalculatorInput[]

/** Points that are each possible but make no linkage. */
function relationsOf(values: LinkageInputs): FieldMessage[] {
  const errors: FieldMessage[] = []
  const need = (holds: boolean, field: keyof LinkageInputs, message: Sentence) => {
    if (!holds) errors.push({ field, message })
  }
  const apart = (
    from: 'lowerInner' | 'lowerOuter' | 'upperInner' | 'tieRodInner',
    to: 'lowerOuter' | 'upperOuter' | 'tieRodOuter',
  ) => Math.hypot(values[`${to}Y`] - values[`${from}Y`], values[`${to}Z`] - values[`${from}Z`]) >= shortest
  const least = figure(shortest, 'mm')
  need(
    apart('lowerInner', 'lowerOuter'),
    'lowerOuterY',
    say`The ends of the lower arm must be at least ${least} apart.`,
  )
  need(
    apart('upperInner', 'upperOuter'),
    'upperOuterY',
    say`The ends of the upper link must be at least ${least} apart.`,
  )
  need(
    apart('lowerOuter', 'upperOuter'),
    'upperOuterZ',
    say`The two outer joints must be at least ${least} apart: the upright is held between them.`,
  )
  need(
    Math.abs(values.tieRodOuterY - values.tieRodInnerY) >= shortest,
    'tieRodOuterY',
    say`The ends of the tie rod must be at least ${least} apart sideways: an upright rod does not steer.`,
  )
  need(
    Math.abs(values.steeringArm) >= shortest,
    'steeringArm',
    say`The steering arm must be at least ${least} long, in front (plus) or behind (minus): without one a rod cannot hold the wheel.`,
  )
  return errors
}

function warningsAbout(
  values: LinkageInputs,
  { bumpSteer, parallel }: { bumpSteer: number; parallel: boolean },
): FieldMessage[] {
  const warnings: FieldMessage[] = []
  const warn = (when: boolean, field: keyof LinkageInputs, message: Sentence) => {
    if (when) warnings.push({ field, message })
  }
  warn(
    parallel,
    'upperInnerZ',
    say`The two arms are parallel, so their lines never meet: the instant centre is infinitely far away. It is listed a million metres off for want of a number; everything else is exact.`,
  )
  warn(
    values.upperOuterZ < values.lowerOuterZ,
    'upperOuterZ',
    say`The upper link’s outer end lies below the lower arm’s. Check that the two are not exchanged.`,
  )
  warn(
    Math.abs(bumpSteer) > 0.15,
    'tieRodOuterZ',
    say`Toe changes by ${figure(Math.abs(bumpSteer), 'deg/mm', 2)} of travel. That is a lot; measure the rod’s ends again, or move one up or down.`,
  )
  return warnings
}
