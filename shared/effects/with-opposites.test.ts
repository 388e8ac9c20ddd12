import { describe, expect, it } from 'vitest'
import { withOpposites } from './with-opposites.ts'

const effect = { adjustable: 'rear_toe', direction: 'up', phase: 'exit', quality: 'rear_grip', change: 'more', mirrors: true } as const

describe('withOpposites', () => {
  it('reads an effect that mirrors the other way round too', () => {
    expect(withOpposites([effect])).toEqual([
      { effect, direction: 'up', change: 'more', mirrored: false },
      { effect, direction: 'down', change: 'less', mirrored: true },
    ])
  })

  it('leaves one that does not mirror as it stands', () => {
    expect(withOpposites([{ ...effect, mirrors: false }])).toHaveLength(1)
  })

  it('gives way to what the other direction says itself, at the same place only', () => {
    const own = { ...effect, direction: 'down', mirrors: false } as const
    expect(withOpposites([effect, own]).some(({ mirrored }) => mirrored)).toBe(false)
    for (const elsewhere of [{ phase: 'entry' }, { quality: 'drive' }, { adjustable: 'droop' }]) {
      expect(withOpposites([effect, { ...own, ...elsewhere }]).some(({ mirrored }) => mirrored)).toBe(true)
    }
  })
})
