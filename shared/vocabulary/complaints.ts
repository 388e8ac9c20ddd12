export { complaintKey, complaintWords, complaints }
export type { NamedComplaint }

import { PHASES, type Phase } from './phases.ts'
import { qualities, type Quality } from './qualities.ts'
import type { Change } from './effect-words.ts'

/** What the car does wrong, in the driver's words, and what the driver wants instead. */
interface NamedComplaint {
  phase: Phase
  quality: Quality
  wants: Change
  says: string
}

type Row = readonly [says: string, quality: Quality, wants: Change]

/** The commonest first at each part of the lap; short enough to stand four in a row beside the track. */
const table: Record<Phase, readonly Row[]> = {
  entry: [
    ['Pushes', 'steering', 'more'],
    ['Loose, off power', 'rear_grip', 'more'],
    ['Darts in', 'steering', 'less'],
    ['Nervous', 'stability', 'more'],
    ['Leans over', 'roll', 'less'],
  ],
  middle: [
    ['Pushes', 'steering', 'more'],
    ['Rear steps out', 'rear_grip', 'more'],
    ['Traction-rolls', 'roll_over_safety', 'more'],
    ['Turns in on itself', 'steering', 'less'],
    ['Leans over', 'roll', 'less'],
  ],
  exit: [
    ['Loose on power', 'rear_grip', 'more'],
    ['Pushes on power', 'steering', 'more'],
    ['Spins its wheels', 'drive', 'more'],
    ['Lazy', 'acceleration', 'more'],
    ['Darts', 'stability', 'more'],
  ],
  straight: [
    ['Wanders', 'stability', 'more'],
    ['Runs out of speed', 'top_speed', 'more'],
    ['Lazy', 'acceleration', 'more'],
    ['Motor gets hot', 'motor_heat', 'less'],
    ['Battery fades', 'run_time', 'more'],
  ],
  bumps: [
    ['Skips and kicks', 'absorption', 'more'],
    ['Nervous', 'stability', 'more'],
    ['Rear kicks round', 'rear_grip', 'more'],
    ['Loses drive', 'drive', 'more'],
  ],
  jumps: [
    ['Nose-dives', 'nose_up', 'more'],
    ['Nose too high', 'nose_up', 'less'],
    ['Bottoms out', 'landing', 'more'],
    ['Lands crooked', 'stability', 'more'],
  ],
}

const complaints: readonly NamedComplaint[] = PHASES.flatMap((phase) =>
  table[phase].map(([says, quality, wants]) => ({ phase, quality, wants, says })),
)

/** A complaint as addresses and programs write it: `entry.steering.more`. */
function complaintKey({ phase, quality, wants }: Pick<NamedComplaint, 'phase' | 'quality' | 'wants'>): string {
  return `${phase}.${quality}.${wants}`
}

/** “Pushes” where drivers have a word for it, else what is wanted: “more body roll”. Stands beside its part of the lap. */
function complaintWords(complaint: Pick<NamedComplaint, 'phase' | 'quality' | 'wants'>): string {
  const named = complaints.find((each) => complaintKey(each) === complaintKey(complaint))
  return named?.says ?? `Wants ${complaint.wants} ${qualities[complaint.quality].name}`
}
