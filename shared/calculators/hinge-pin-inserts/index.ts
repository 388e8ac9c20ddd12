export { calculator }

import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { pinDrawings } from './drawings.ts'
import { axleWith } from './inserts.ts'
import { insertsWorking } from './working.ts'

const offset = <const Key extends string>(key: Key, label: string, help: string): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'mm',
  default: 0,
  min: -10,
  max: 10,
  step: 0.5,
  reason: 'no insert moves its hole further than that',
})

const base = <const Key extends string>(
  key: Key,
  label: string,
  limit: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'deg',
  default: 0,
  min: -limit,
  max: limit,
  step: 0.5,
  reason: 'no block or hub is made with more than that',
})

const calculator = defineCalculator({
  slug: 'hinge-pin-inserts',
  title: 'What your hinge-pin inserts do',
  purpose:
    'Says which toe, pin angle, pin height and track a set of inserts gives one axle. Use it before you swap an insert, because one insert changes more than one thing.',
  part: 'wheel angles',
  keywords: [
    'insert',
    'pill',
    'bushing',
    'hinge pin',
    'suspension block',
    'toe',
    'anti-squat',
    'kick-up',
    'arm sweep',
    'track width',
  ],
  inputs: [
    {
      key: 'blockSpacing',
      label: 'Front block to rear block',
      unit: 'mm',
      default: 60,
      min: 5,
      max: 300,
      step: 1,
      reason: 'that is the range of hinge pins from the smallest cars to the largest',
      help: 'Between the middles of the two blocks that hold one inner pin.',
      carKey: { front: 'frontBlockSpacing', rear: 'rearBlockSpacing' },
    },
    offset(
      'frontOut',
      'Front block: hole out',
      'Away from the centre line counts plus, towards it minus. Zero is the middle.',
    ),
    offset('frontUp', 'Front block: hole up', 'Up counts plus, down minus.'),
    offset('rearOut', 'Rear block: hole out', 'Away from the centre line counts plus, towards it minus.'),
    offset('rearUp', 'Rear block: hole up', 'Up counts plus, down minus.'),
    base(
      'baseToe',
      'Toe without inserts',
      20,
      'What hubs and blocks have built in, one wheel, toe-in plus. In the manual, or zero.',
    ),
    base(
      'baseAngle',
      'Pin angle without inserts',
      30,
      'What the blocks have built in, front end higher counts plus. In the manual, or zero.',
    ),
  ],
  outputs: [
    { key: 'toe', label: 'Toe of one wheel', unit: 'deg', digits: 3 },
    { key: 'pinAngle', label: 'Pin angle, front end higher', unit: 'deg', digits: 3 },
    { key: 'pinHeight', label: 'Pin moves up by', unit: 'mm', digits: 3 },
    { key: 'trackChange', label: 'Track grows by', unit: 'mm', digits: 3 },
  ],
  compute: (inputs) => ({ ...axleWith(inputs) }),
  warnings(inputs, { toe, pinAngle }) {
    const warnings: FieldMessage[] = []
    if (Math.abs(toe) > 6) {
      warnings.push({
        field: 'rearOut',
        message: say`That makes ${figure(toe, 'deg')} of toe at one wheel. Check that drive shafts still turn freely and do not come out.`,
      })
    }
    if (Math.abs(pinAngle) > 15) {
      warnings.push({
        field: 'rearUp',
        message: say`A pin tilted by ${figure(pinAngle, 'deg')} is far from what blocks are made for. Check the signs.`,
      })
    }
    const bend = Math.hypot(inputs.rearOut - inputs.frontOut, inputs.frontUp - inputs.rearUp)
    if (bend > inputs.blockSpacing / 4) {
      warnings.push({
        field: 'blockSpacing',
        message: say`The ends of the pin stand ${figure(bend, 'mm')} apart over ${figure(inputs.blockSpacing, 'mm')}. Holes of inserts take only a few degrees before the pin binds.`,
      })
    }
    return warnings
  },
  answer(_inputs, { toe, pinAngle, pinHeight, trackChange }) {
    const name = toe === 0 ? 'toe' : toe > 0 ? 'toe-in' : 'toe-out'
    return {
      says: [
        ...say`These inserts give ${mainFigure(Math.abs(toe), 'deg')} of ${name} at each wheel and `,
        ...tilt(pinAngle),
      ],
      more: [
        heightAndTrack(pinHeight, trackChange),
        say`At a rear axle the pin angle is anti-squat, at a front axle kick-up. At a front axle the tie rods set toe again: read the angle there as the sweep of the arms.`,
      ],
    }
  },
  working: insertsWorking,
  drawings: (inputs, outputs) => pinDrawings(inputs, outputs),
  comparison(inputs, outputs) {
    const centred = axleWith({ ...inputs, frontOut: 0, frontUp: 0, rearOut: 0, rearUp: 0 })
    return {
      says: differenceInWords(outputs.toe - centred.toe, outputs.pinAngle - centred.pinAngle),
      caption: 'What the inserts change',
      columns: ['All in the middle', 'These inserts'],
      rows: [
        { label: say`Toe of one wheel`, unit: 'deg', digits: 3, cells: [centred.toe, outputs.toe] },
        { label: say`Pin angle`, unit: 'deg', digits: 3, cells: [centred.pinAngle, outputs.pinAngle] },
        { label: say`Pin height`, unit: 'mm', digits: 3, cells: [0, outputs.pinHeight] },
        { label: say`Track`, unit: 'mm', digits: 3, cells: [0, outputs.trackChange] },
      ],
    }
  },
  limits: {
    goodBetween:
      'Both sides with mirrored inserts, a straight pin held at the middles of its two blocks, offsets of a few millimetres.',
    howClose:
      'Exact for the pin as a line. A wheel ahead of or behind the pin’s middle moves a little more or less out than the pin’s middle does; play in the inserts is usually more than that.',
  },
  sources: [
    {
      text: 'A pin through two points: plane trigonometry, seen from above for toe and from the side for the pin angle.',
      known: 'Common practice; checked against vectors in three dimensions with mathjs.',
    },
    {
      text: 'ISO 8855:2011, 7.1.6: toe-in positive, front of the wheel inboard.',
      known: 'Read in excerpts.',
    },
  ],
  cautions: [
    {
      kind: 'eyes',
      title: 'Clips of hinge pins',
      order: 'Wear glasses when you pull an E-clip from a hinge pin.',
      reason: 'It leaves fast, it is sharp, and your face is right above it.',
    },
  ],
})

function tilt(pinAngle: number): Sentence {
  if (pinAngle === 0) return say`a level pin.`
  return say`a pin tilted by ${figure(Math.abs(pinAngle), 'deg')}, ${pinAngle > 0 ? 'front' : 'rear'} end higher.`
}

function heightAndTrack(pinHeight: number, trackChange: number): Sentence {
  if (pinHeight === 0 && trackChange === 0) return say`Pin height and track stay as they were.`
  return [
    ...moved('The pin', pinHeight, 'higher', 'lower'),
    ', and ',
    ...moved('the track', trackChange, 'wider', 'narrower'),
    '.',
  ]
}

function moved(what: string, change: number, more: string, less: string): Sentence {
  if (change === 0) return say`${what} stays as it was`
  return say`${what} is ${figure(Math.abs(change), 'mm')} ${change > 0 ? more : less}`
}

/** The difference that the inserts make to toe and tilt; what does not change is not mentioned. */
function differenceInWords(toe: number, tilted: number): Sentence {
  const parts: Sentence[] = []
  if (toe !== 0) parts.push(say`turn each wheel ${figure(Math.abs(toe), 'deg')} ${toe > 0 ? 'in' : 'out'}`)
  if (tilted !== 0) {
    parts.push(
      say`tilt the pin by ${figure(Math.abs(tilted), 'deg')}, ${tilted > 0 ? 'front' : 'rear'} end up`,
    )
  }
  const [first, second] = parts
  if (first === undefined) return say`These inserts change neither toe nor pin angle.`
  return ['These inserts ', ...first, ...(second ? [' and ', ...second] : []), '.']
}
