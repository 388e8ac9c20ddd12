export { complaintsFor }
export type { Complaint }

import type { Change } from '#shared/vocabulary/effect-words.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'
import type { Quality } from '#shared/vocabulary/qualities.ts'

/** What a driver says about one part of the lap, and what the car needs then. */
interface Complaint {
  says: string
  quality: Quality
  wants: Change
}

/** The commonest complaints first; short enough to stand four in a row beside the track. */
const complaints: Record<Phase, readonly Complaint[]> = {
  entry: [
    { says: 'Pushes', quality: 'steering', wants: 'more' },
    { says: 'Darts in', quality: 'steering', wants: 'less' },
    { says: 'Nervous', quality: 'stability', wants: 'more' },
    { says: 'Loose', quality: 'rear_grip', wants: 'more' },
  ],
  middle: [
    { says: 'Pushes', quality: 'steering', wants: 'more' },
    { says: 'Rear steps out', quality: 'rear_grip', wants: 'more' },
    { says: 'Traction-rolls', quality: 'roll_over_safety', wants: 'more' },
  ],
  exit: [
    { says: 'Pushes', quality: 'steering', wants: 'more' },
    { says: 'Loose', quality: 'rear_grip', wants: 'more' },
    { says: 'Spins a wheel', quality: 'drive', wants: 'more' },
  ],
  straight: [
    { says: 'Wanders', quality: 'stability', wants: 'more' },
    { says: 'Lazy', quality: 'acceleration', wants: 'more' },
    { says: 'Runs out of speed', quality: 'top_speed', wants: 'more' },
  ],
  bumps: [
    { says: 'Skips and kicks', quality: 'absorption', wants: 'more' },
    { says: 'Nervous', quality: 'stability', wants: 'more' },
    { says: 'Loses drive', quality: 'drive', wants: 'more' },
  ],
  jumps: [
    { says: 'Nose-dives', quality: 'nose_up', wants: 'more' },
    { says: 'Nose too high', quality: 'nose_up', wants: 'less' },
    { says: 'Bottoms out', quality: 'landing', wants: 'more' },
  ],
}

/**
 * The complaints about a part of the lap that the book has an answer to, each with the address of its answers: a link from
 * the front page never leads to an empty list.
 * @param answered anchors of the wishes that published effects meet there, such as `steering-more`
 */
function complaintsFor(phase: Phase, answered: ReadonlySet<string>): { text: string; href: string }[] {
  return complaints[phase]
    .map(({ says, quality, wants }) => ({ text: says, anchor: `${quality}-${wants}` }))
    .filter(({ anchor }) => answered.has(anchor))
    .map(({ text, anchor }) => ({ text, href: `/lap/${phase}#${anchor}` }))
}
