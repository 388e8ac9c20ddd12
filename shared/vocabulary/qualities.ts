export { QUALITIES, qualities }
export type { Quality, Wanted }

const QUALITIES = [
  'steering',
  'rear_grip',
  'drive',
  'stability',
  'roll',
  'roll_over_safety',
  'absorption',
  'nose_up',
  'landing',
  'acceleration',
  'top_speed',
  'run_time',
  'motor_heat',
] as const
type Quality = (typeof QUALITIES)[number]

/** Which way a driver usually wants a quality to go; by feel counts the other way as a cost. */
type Wanted = 'more' | 'less' | 'neither'

interface QualityWords {
  name: string
  /** What the driver says when there is more of it. */
  more: string
  /** What the driver says when there is less of it. */
  less: string
  wanted: Wanted
  /** Which end of the car the quality is felt at; drawn as the colour of a pin, always beside the quality's name. */
  end: 'front' | 'rear' | 'whole'
}

const qualities: Record<Quality, QualityWords> = {
  steering: { name: 'steering', more: 'turns in harder', less: 'pushes', wanted: 'more', end: 'front' },
  rear_grip: {
    name: 'rear grip',
    more: 'rear stays planted',
    less: 'rear comes round',
    wanted: 'more',
    end: 'rear',
  },
  drive: {
    name: 'forward drive',
    more: 'pulls forward on power',
    less: 'wheels spin, lazy off the corner',
    wanted: 'more',
    end: 'whole',
  },
  stability: {
    name: 'stability',
    more: 'calm, easy to place',
    less: 'nervous, darts',
    wanted: 'more',
    end: 'whole',
  },
  roll: { name: 'body roll', more: 'leans over further', less: 'stays flat', wanted: 'neither', end: 'whole' },
  roll_over_safety: {
    name: 'roll-over safety',
    more: 'slides before it tips',
    less: 'traction-rolls',
    wanted: 'more',
    end: 'whole',
  },
  absorption: {
    name: 'absorption',
    more: 'soaks up bumps',
    less: 'skips and kicks',
    wanted: 'more',
    end: 'whole',
  },
  nose_up: {
    name: 'nose height in the air',
    more: 'jumps nose-high',
    less: 'jumps nose-down',
    wanted: 'neither',
    end: 'whole',
  },
  landing: {
    name: 'landing',
    more: 'settles at once',
    less: 'bottoms out, bounces',
    wanted: 'more',
    end: 'whole',
  },
  acceleration: { name: 'acceleration', more: 'leaps off the corner', less: 'lazy', wanted: 'more', end: 'whole' },
  top_speed: {
    name: 'top speed',
    more: 'longer legs',
    less: 'runs out of speed',
    wanted: 'more',
    end: 'whole',
  },
  run_time: { name: 'run time', more: 'battery lasts', less: 'fades early', wanted: 'more', end: 'whole' },
  motor_heat: { name: 'motor heat', more: 'hotter', less: 'cooler', wanted: 'less', end: 'whole' },
}
