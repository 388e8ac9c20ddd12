import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compareBodies } from '#shared/editing/compare-bodies.ts'
import { arbitraryBody } from '#shared/editing/guides.arbitrary.ts'
import { textAfter } from '#shared/editing/segments.ts'
import { placeRemarks, type Placed, type Remark } from './place-remarks.ts'

const remark = (line: number): Remark => ({ line, message: `about line ${line}`, holds: false })
const textOf = (block: Placed) => (block.kind === 'same' ? block.text : textAfter(block.words))

describe('placeRemarks', () => {
  const before = 'First.\n\nSecond.\n\nThird of the four.\n\nFourth.\n'
  const after = 'First.\n\nSecond.\n\nThird of the four.\nOn two lines.\n\nFourth.\n'

  it('puts a remark to the paragraph that holds its line, changed or not, and folds no other paragraph out', () => {
    const placed = placeRemarks(compareBodies(before, after), [remark(6), remark(3)])
    expect(placed.map((block) => [block.kind, block.remarks.map(({ id, line }) => [id, line])])).toEqual([
      ['same', []],
      ['same', [['remark-2', 3]]],
      ['changed', [['remark-1', 6]]],
      ['same', []],
    ])
    expect(textOf(placed[1]!)).toContain('Second.')
  })

  it('keeps the whole text and places every line of it exactly once', () => {
    fc.assert(
      fc.property(arbitraryBody, arbitraryBody, (old, fresh) => {
        const lines = fresh === '' ? 0 : fresh.split('\n').length - (fresh.endsWith('\n') ? 1 : 0)
        const remarks = Array.from({ length: lines }, (_, at) => remark(at + 1))
        const changes = compareBodies(old, fresh)
        const placed = placeRemarks(changes, remarks)
        expect(placed.map(textOf).join('')).toBe(fresh)
        expect(placed.flatMap((block) => block.remarks.map(({ line }) => line))).toEqual(remarks.map(({ line }) => line))
        expect(placeRemarks(changes, []).map(textOf).join('')).toBe(fresh)
      }),
    )
  })
})
