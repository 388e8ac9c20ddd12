import { expect, it } from 'vitest'
import { sizeWords } from './size-words.ts'

it('names each kind of change that there is, in the singular for one', () => {
  const sizes = { words: 31, fields: 1, effects: 0, calculators: 0, pictures: 0, sources: 2 }
  expect(sizeWords(sizes).map(({ count, name }) => `${count} ${name}`)).toEqual(['1 field', '31 words', '2 sources'])
})
