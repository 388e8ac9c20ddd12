export { readChange, reportAddress }
export type { ReportableChange }

import { DIRECTIONS, type Direction } from '../vocabulary/effect-words.ts'

/** A change as a report speaks of it: an adjustable and one of its two directions. */
interface ReportableChange {
  adjustable: string
  direction: Direction
}

/** Reads `front_sway_bar.down`; undefined for anything else. Whether there is such an adjustable, the database knows. */
function readChange(text: string | undefined): ReportableChange | undefined {
  const [, adjustable, way] = /^([a-z_]{1,60})\.([a-z]+)$/.exec(text ?? '') ?? []
  const direction = DIRECTIONS.find((each) => each === way)
  return adjustable === undefined || direction === undefined ? undefined : { adjustable, direction }
}

/**
 * Where a member says how a change went, with what is known already filled in. Texts may be anything: they are read again there.
 * @param at.back the page to return to afterwards
 */
function reportAddress(
  at: { change: string; class?: string | undefined; surface?: string | undefined; bite?: string | undefined; back?: string | undefined },
  more: Record<string, string> = {},
): string {
  const parameters = new URLSearchParams()
  for (const [name, text] of Object.entries({ ...at, ...more })) if (text !== undefined && text !== '') parameters.set(name, text)
  return `/report?${parameters.toString()}`
}
