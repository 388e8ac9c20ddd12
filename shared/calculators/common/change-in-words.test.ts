import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { changeInWords } from './change-in-words.ts'

const words = (ratio: number) => plainSentence(changeInWords(ratio, 'stiffer', 'softer', 'just as stiff'))

describe('changeInWords', () => {
  it.each([
    [1.3774, '38\u00A0% stiffer'],
    [0.8, '20\u00A0% softer'],
    [1.0333, '3.3\u00A0% stiffer'],
    [0.9949, '0.5\u00A0% softer'],
    [3.456, '246\u00A0% stiffer'],
    [1.0004, 'just as stiff'],
    [1, 'just as stiff'],
  ])('says of %d: %s', (ratio, expected) => {
    expect(words(ratio)).toBe(expected)
  })
})
