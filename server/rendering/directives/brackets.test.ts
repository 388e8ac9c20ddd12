import { expect, test } from 'vitest'
import { matchBrackets } from './brackets.ts'

/** The text from each bracket that closes to its end. */
function spans(source: string): string[] {
  return [...matchBrackets(source)].map(([open, close]) => source.slice(open, close + 1)).sort()
}

test.each([
  ['[a]', ['[a]']],
  ['[a [b] c]', ['[a [b] c]', '[b]']],
  ['[a', []],
  ['a]', []],
  ['[ :x[a]', ['[a]']],
  ['[a\\]b]', ['[a\\]b]']],
  ['\\[a]', []],
  ['[`]`]', ['[`]`]']],
  ['[``a`]``]', ['[``a`]``]']],
  ['[`a]', ['[`a]']],
  ['[\\`a]`]', ['[\\`a]']],
  ['[a`b]`c', []],
])('%s', (source, expected) => {
  expect(spans(source)).toEqual(expected)
})
