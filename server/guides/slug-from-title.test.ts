import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { nextFreeSlug, slugFromTitle } from './slug-from-title.ts'

describe('slugFromTitle', () => {
  it.each([
    ['Front diff fluid', 'front-diff-fluid'],
    ['  Kick-up & anti-squat: 2° or 3°?  ', 'kick-up-anti-squat-2-or-3'],
    ['Réglage des barres', 'reglage-des-barres'],
    ['The car’s droop', 'the-cars-droop'],
    ['Подвеска', 'guide'],
    ['x'.repeat(90), 'x'.repeat(80)],
    ['word '.repeat(18), 'word-word-word-word-word-word-word-word-word-word-word-word-word-word-word-word'],
  ])('%s', (title, slug) => {
    expect(slugFromTitle(title)).toBe(slug)
  })

  it('always fits the database’s rule, also with a number behind it', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string({ maxLength: 120 }), fc.string({ unit: 'binary', maxLength: 120 })), (title) => {
        const slug = nextFreeSlug(slugFromTitle(title), new Set([slugFromTitle(title)]))
        expect(slug).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/)
        expect(slug.length).toBeLessThanOrEqual(90)
      }),
    )
  })
})

it('nextFreeSlug counts on past those that are taken', () => {
  expect(nextFreeSlug('droop', new Set())).toBe('droop')
  expect(nextFreeSlug('droop', new Set(['droop', 'droop-2']))).toBe('droop-3')
})
