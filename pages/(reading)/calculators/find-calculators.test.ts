import fc from 'fast-check'
import { beforeAll, describe, expect, it } from 'vitest'
import { loadCalculators } from '#server/calculators/index.ts'
import { findAmong, searchWords } from './find-calculators.ts'

let entries: { slug: string; words: string }[]
beforeAll(async () => {
  entries = [...(await loadCalculators()).values()].map((calculator) => ({
    slug: calculator.slug,
    words: searchWords(calculator),
  }))
})
const found = (question: string) => findAmong(entries, question).map(({ slug }) => slug)

describe('finding a calculator by plain words', () => {
  it.each([
    ['pinion', 'gearing'],
    ['how thick in the heat', 'fluid-temperature'],
    ['mix two bottles', 'fluid-blend'],
    ['anti squat', 'anti-squat'],
    ['Anti-Squat', 'anti-squat'],
    ['antisquat', 'anti-squat'],
    ['anti-roll bars', 'sway-bar'],
    ['hinge pins', 'hinge-pin-inserts'],
    ['which spring is this', 'spring-rate'],
    ['stiffness', 'spring-rate'],
    ['batteries', 'move-weight'],
  ])('“%s” finds %s', (question, slug) => {
    expect(found(question)).toContain(slug)
  })

  it('finds little for a word that few have', () => {
    expect(found('pinion').length).toBeLessThan(4)
  })

  it('gives everything for a question without a word that counts, nothing for a word that no one has', () => {
    expect(found('')).toHaveLength(entries.length)
    expect(found('  how is it? ')).toHaveLength(entries.length)
    expect(found('xylophone')).toEqual([])
  })

  it('takes any text', () => {
    fc.assert(fc.property(fc.string({ unit: 'grapheme' }), (question) => Array.isArray(found(question))))
  })

  it('finds a calculator by every word of its own title', () => {
    for (const { slug, words } of entries) {
      expect(findAmong([{ slug, words }], words.split(' ').slice(0, 4).join(' '))).toHaveLength(1)
    }
  })
})
