import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { insertMark, lineRange } from './insert-mark.ts'

const term = { skeleton: ':term[|droop|]', block: false }
const caution = { skeleton: ':::caution{kind=heat}\n|Do this first.| Then why.\n:::', block: true }

describe('insertMark', () => {
  it('puts selected words inside an inline mark', () => {
    const done = insertMark('The car pushes on entry.', 8, 14, term)
    expect(done.text).toBe('The car :term[pushes] on entry.')
    expect(done.text.slice(done.from, done.to)).toBe('pushes')
  })

  it('leaves words to change where nothing was selected', () => {
    const done = insertMark('More ', 5, 5, term)
    expect(done.text).toBe('More :term[droop]')
    expect(done.text.slice(done.from, done.to)).toBe('droop')
  })

  it('puts a block after the line of the cursor, with a blank line on both sides', () => {
    const done = insertMark('One line.\nNext line.', 3, 3, caution)
    expect(done.text).toBe('One line.\n\n:::caution{kind=heat}\nDo this first. Then why.\n:::\n\nNext line.')
    expect(done.text.slice(done.from, done.to)).toBe('Do this first.')
  })

  it('starts an empty text and fills a blank line without adding more', () => {
    expect(insertMark('', 0, 0, { skeleton: '::effects{adjustable=|droop|}', block: true }).text).toBe('::effects{adjustable=droop}\n')
    expect(insertMark('One.\n\nTwo.', 5, 5, { skeleton: '::x', block: true }).text).toBe('One.\n\n::x\n\nTwo.')
  })

  it('never loses a word of the text', () => {
    fc.assert(
      fc.property(fc.string(), fc.nat(200), fc.nat(200), fc.constantFrom(term, caution), (text, one, other, mark) => {
        const [from, to] = [Math.min(one, other, text.length), Math.min(Math.max(one, other), text.length)]
        const squeeze = (words: string) => words.replaceAll('\n', '')
        const { text: after } = insertMark(text, from, to, mark)
        let at = 0
        for (const character of squeeze(after)) if (character === squeeze(text)[at]) at += 1
        expect(at).toBe(squeeze(text).length)
      }),
    )
  })
})

describe('lineRange', () => {
  it.each([
    [1, 'one'], [2, ''], [3, 'three'], [9, 'three'],
  ])('finds line %i', (line, words) => {
    const text = 'one\n\nthree'
    const { from, to } = lineRange(text, line)
    expect(text.slice(from, to)).toBe(words)
  })
})
