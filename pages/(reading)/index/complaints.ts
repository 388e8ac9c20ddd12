export { complaintsFor }

import { complaintKey, complaints } from '#shared/vocabulary/complaints.ts'
import { feelAddress } from '#shared/feel/feel-query.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'

/** More do not stand beside the track. */
const SHOWN = 4

/**
 * The commonest complaints about a part of the lap that the book has an answer to, each with the address of its answers: a
 * link from the front page never leads to an empty list.
 * @param answered what published effects can give, such as `entry.steering.more`
 */
function complaintsFor(phase: Phase, answered: ReadonlySet<string>): { text: string; href: string }[] {
  return complaints
    .filter((complaint) => complaint.phase === phase && answered.has(complaintKey(complaint)))
    .slice(0, SHOWN)
    .map(({ says, quality, wants }) => ({ text: says, href: feelAddress('/feel', { complaints: [{ phase, quality, wants }] }) }))
}
