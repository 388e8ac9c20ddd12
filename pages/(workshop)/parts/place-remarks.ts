export { placeRemarks }
export type { Placed, PlacedRemark, Remark }

import { linesOf, splitBlocks } from '#shared/editing/blocks.ts'
import type { BodyChange } from '#shared/editing/compare-bodies.ts'
import { textAfter, wordCount } from '#shared/editing/segments.ts'

/** What laying a text out has noticed; `line` counts in the Markdown as it is proposed. */
interface Remark {
  line: number
  message: string
  holds: boolean
}

type PlacedRemark = Remark & { id: string }
type Placed = BodyChange & { remarks: PlacedRemark[] }

/**
 * Puts each remark to the stretch of the compared body it is about. A run of unchanged paragraphs is parted round one that
 * is remarked on, so that this one is not folded away with the others.
 */
function placeRemarks(body: readonly BodyChange[], remarks: readonly Remark[]): Placed[] {
  const numbered = remarks.map((remark, at) => ({ ...remark, id: `remark-${at + 1}` }))
  let line = 1
  const take = (text: string) => {
    const end = line + linesOf(text).length
    const own = numbered.filter((remark) => remark.line >= line && remark.line < end)
    line = end
    return own
  }
  return body.flatMap((block): Placed[] => {
    if (block.kind !== 'same') return [{ ...block, remarks: take(textAfter(block.words)) }]
    return joinUnremarked(splitBlocks(block.text).map((text) => ({ kind: 'same', text, blocks: 1, words: wordCount(text), remarks: take(text) })))
  })
}

type PlacedSame = Extract<Placed, { kind: 'same' }>

function joinUnremarked(blocks: readonly PlacedSame[]): PlacedSame[] {
  const joined: PlacedSame[] = []
  for (const block of blocks) {
    const last = joined.at(-1)
    if (last === undefined || last.remarks.length > 0 || block.remarks.length > 0) joined.push(block)
    else {
      joined[joined.length - 1] = {
        ...last, text: last.text + block.text, blocks: last.blocks + block.blocks, words: last.words + block.words,
      }
    }
  }
  return joined
}
