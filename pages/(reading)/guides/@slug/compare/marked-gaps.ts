export { withoutMarkedGaps }

import type { Segment } from '#shared/editing/segments.ts'

/**
 * Takes the mark off the line ends inside what was put in or taken out: an empty line has nothing to strike or underline.
 * Line ends before the first word and after the last one are left out.
 */
function withoutMarkedGaps(segments: readonly Segment[]): Segment[] {
  const pieces = segments.flatMap((segment) =>
    segment.kind === 'same'
      ? [segment]
      : segment.text
          .split(/(\n+)/)
          .filter((text) => text !== '')
          .map((text): Segment => ({ kind: text.startsWith('\n') ? 'same' : segment.kind, text })),
  )
  const isGap = ({ kind, text }: Segment) => kind === 'same' && text.trim() === ''
  const first = pieces.findIndex((piece) => !isGap(piece))
  const last = pieces.findLastIndex((piece) => !isGap(piece))
  return first === -1 ? [] : pieces.slice(first, last + 1)
}
