import { describe, expect, it } from 'vitest'
import { dayOf, momentInWords, waitingSince } from './format-moment.ts'

const now = new Date('2026-03-15T09:00:00Z')

describe('momentInWords', () => {
  it.each([
    ['2026-03-15T08:12:00Z', 'today at 08:12 UTC'],
    ['2026-03-14T23:59:00Z', 'yesterday at 23:59 UTC'],
    ['2026-03-13T19:40:00Z', '13 March at 19:40 UTC'],
    ['2025-12-31T00:05:00Z', '31 December 2025 at 00:05 UTC'],
  ])('says %s as “%s”', (iso, words) => {
    expect(momentInWords(iso, now, 'utc')).toBe(words)
  })

  it('leaves the zone out when it is the reader’s own', () => {
    expect(momentInWords(now.toISOString(), now, 'local')).toMatch(/^today at \d\d:\d\d$/)
  })
})

describe('dayOf', () => {
  it('names the day in UTC', () => expect(dayOf('2026-01-01T00:00:00Z')).toBe('1 January 2026'))
})

describe('waitingSince', () => {
  it.each([
    ['2026-03-15T08:30:00Z', 'less than an hour'],
    ['2026-03-15T07:59:00Z', '1 hour'],
    ['2026-03-15T04:00:00Z', '5 hours'],
    ['2026-03-14T08:00:00Z', '1 day'],
    ['2026-03-12T08:00:00Z', '3 days'],
    ['2026-03-15T09:05:00Z', 'less than an hour'],
  ])('counts from %s: %s', (iso, words) => {
    expect(waitingSince(iso, now)).toBe(words)
  })
})
