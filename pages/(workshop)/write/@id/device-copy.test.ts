import { describe, expect, it } from 'vitest'
import { emptyGuideContent } from '#shared/schemas/guide-content.ts'
import { createDeviceCopies } from './device-copy.ts'
import type { DeviceCopy } from './draft-keeper.ts'

function memory() {
  const kept = new Map<string, string>()
  return {
    kept,
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, text: string) => void kept.set(key, text),
    removeItem: (key: string) => void kept.delete(key),
    key: (at: number) => [...kept.keys()][at] ?? null,
    get length() {
      return kept.size
    },
  }
}

const copy = (body: string, keptAt: string): DeviceCopy => ({
  content: { ...emptyGuideContent(), body }, summary: '', version: 1, keptAt,
})

describe('copies of a draft on the device', () => {
  it('finds the newest copy of any tab, and none of another draft', () => {
    const store = memory()
    createDeviceCopies(store, 'e1', 'tab1').write(copy('older', '2026-03-14T14:00:00Z'))
    createDeviceCopies(store, 'e1', 'tab2').write(copy('newer', '2026-03-14T14:05:00Z'))
    createDeviceCopies(store, 'e2', 'tab1').write(copy('other', '2026-03-14T14:10:00Z'))
    expect(createDeviceCopies(store, 'e1', 'tab3').newest()?.content.body).toBe('newer')
  })

  it('clears only what its own tab has kept', () => {
    const store = memory()
    const mine = createDeviceCopies(store, 'e1', 'tab1')
    mine.write(copy('mine', '2026-03-14T14:00:00Z'))
    createDeviceCopies(store, 'e1', 'tab2').write(copy('theirs', '2026-03-14T13:00:00Z'))
    mine.clear()
    expect(mine.newest()?.content.body).toBe('theirs')
  })

  it('forgets a copy and older ones, not one that came later', () => {
    const store = memory()
    const first = copy('first', '2026-03-14T14:00:00Z')
    createDeviceCopies(store, 'e1', 'tab1').write(first)
    createDeviceCopies(store, 'e1', 'tab2').write(copy('later', '2026-03-14T14:01:00Z'))
    createDeviceCopies(store, 'e1', 'tab3').forget(first)
    expect([...store.kept.keys()]).toEqual(['draft:e1:tab2'])
  })

  it('says so when the device cannot keep anything', () => {
    const full = { ...memory(), setItem: () => { throw new DOMException('full', 'QuotaExceededError') } }
    expect(createDeviceCopies(full, 'e1', 't').write(copy('x', ''))).toBe(false)
    expect(createDeviceCopies(null, 'e1', 't').write(copy('x', ''))).toBe(false)
  })

  it.each(['', 'null', '{"version":"1"}', '{'])('passes over what it cannot read: %j', (text) => {
    const store = memory()
    store.setItem('draft:e1:t', text)
    expect(createDeviceCopies(store, 'e1', 't').newest()).toBeNull()
  })
})
