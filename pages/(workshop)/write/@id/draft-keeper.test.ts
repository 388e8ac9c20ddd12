import { describe, expect, it } from 'vitest'
import { emptyGuideContent } from '#shared/schemas/guide-content.ts'
import { createDraftKeeper, type DeviceCopy, type SaveAnswer, type Snapshot } from './draft-keeper.ts'

const words = (body: string): Snapshot => ({ content: { ...emptyGuideContent(), body }, summary: '' })

/** A bench with a clock that is turned by hand, a club that answers when told to, and a device that may be full. */
function bench() {
  let time = Date.parse('2026-03-14T14:00:00Z')
  const timers: { at: number; run: () => void }[] = []
  const asked: { body: string; version: number; leaving: boolean; answer: (answer: SaveAnswer) => void; fail: () => void }[] = []
  const device: { copy: DeviceCopy | null; full: boolean } = { copy: null, full: false }
  const seen: string[] = []
  const keeper = createDraftKeeper(
    { version: 3, saved: words('club'), savedAt: new Date(time) },
    {
      save: ({ content }, version, { leaving }) =>
        new Promise((answer, fail) => asked.push({ body: content.body, version, leaving, answer, fail: () => fail(new Error('offline')) })),
      device: {
        write: (copy) => {
          if (!device.full) device.copy = copy
          return !device.full
        },
        clear: () => (device.copy = null),
      },
      now: () => new Date(time),
      later: (milliseconds, run) => {
        const timer = { at: time + milliseconds, run }
        timers.push(timer)
        return () => timers.splice(0, timers.length, ...timers.filter((other) => other !== timer))
      },
    },
    (state) => seen.push(state.name),
  )
  return {
    keeper, asked, device, seen,
    async pass(milliseconds: number) {
      time += milliseconds
      for (const timer of timers.filter(({ at }) => at <= time)) {
        timers.splice(timers.indexOf(timer), 1)
        timer.run()
      }
      await settled()
    },
  }
}

async function settled(): Promise<void> {
  for (let turn = 0; turn < 6; turn++) await Promise.resolve()
}

describe('a draft keeper', () => {
  it('keeps every change on the device at once and sends it to the club after a rest', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('one'))
    expect(device.copy).toMatchObject({ version: 3, content: { body: 'one' } })
    expect(asked).toEqual([])
    keeper.typed(words('one two'))
    await pass(1_500)
    expect(asked).toMatchObject([{ body: 'one two', version: 3, leaving: false }])
    asked[0]!.answer({ kind: 'saved', version: 4 })
    await settled()
    expect(keeper.state.name).toBe('saved')
    expect(keeper.version).toBe(4)
    expect(device.copy).toBeNull()
  })

  it('saves no more than once in 15 seconds however much is typed', async () => {
    const { keeper, asked, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    asked[0]!.answer({ kind: 'saved', version: 4 })
    await settled()
    for (let second = 0; second < 14; second++) {
      keeper.typed(words(`a${second}`))
      await pass(1_000)
    }
    expect(asked).toHaveLength(1)
    await pass(1_000)
    expect(asked).toMatchObject([{}, { body: 'a13', version: 4 }])
  })

  it('sends what was typed during a save with the next one, on the new version', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    keeper.typed(words('ab'))
    asked[0]!.answer({ kind: 'saved', version: 4 })
    await settled()
    expect(keeper.state.name).toBe('newer')
    expect(device.copy).toMatchObject({ version: 4, content: { body: 'ab' } })
    await pass(15_000)
    expect(asked[1]).toMatchObject({ body: 'ab', version: 4 })
  })

  it('keeps words on the device while the club is away, and tries again less and less often', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    asked[0]!.fail()
    await settled()
    expect(keeper.state.name).toBe('device_only')
    expect(device.copy).toMatchObject({ version: 3, content: { body: 'a' } })
    await pass(4_999)
    expect(asked).toHaveLength(1)
    await pass(1)
    expect(asked).toHaveLength(2)
    asked[1]!.fail()
    await settled()
    await pass(9_999)
    expect(asked).toHaveLength(2)
    await pass(1)
    expect(asked).toHaveLength(3)
  })

  it('waits as long as the club asks it to', async () => {
    const { keeper, asked, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    asked[0]!.answer({ kind: 'unreachable', retryAfterSeconds: 60 })
    await settled()
    await pass(59_000)
    expect(asked).toHaveLength(1)
    await pass(1_000)
    expect(asked).toHaveLength(2)
  })

  it('tries at once when the connection is back', async () => {
    const { keeper, asked, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    asked[0]!.fail()
    await settled()
    keeper.online()
    expect(asked).toHaveLength(2)
  })

  it('stops when another tab has saved meanwhile, and sends nothing until a person has chosen', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('mine'))
    await pass(1_500)
    asked[0]!.answer({ kind: 'stale' })
    await settled()
    expect(keeper.state.name).toBe('conflict')
    keeper.typed(words('mine, longer'))
    keeper.leave()
    expect(await keeper.saveNow()).toBe(false)
    await pass(600_000)
    expect(asked).toHaveLength(1)
    expect(device.copy).toMatchObject({ version: 3, content: { body: 'mine, longer' } })
    keeper.goOn({ version: 7, saved: words('theirs') }, words('mine, longer'))
    await pass(1_500)
    expect(asked[1]).toMatchObject({ body: 'mine, longer', version: 7 })
  })

  it('goes on with the club’s copy without sending anything', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('mine'))
    await pass(1_500)
    asked[0]!.answer({ kind: 'stale' })
    await settled()
    keeper.goOn({ version: 7, saved: words('theirs') }, words('theirs'))
    await pass(600_000)
    expect(keeper.state.name).toBe('saved')
    expect(asked).toHaveLength(1)
    expect(device.copy).toBeNull()
  })

  it('says what the club would not take and tries again once it was changed', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('too long'))
    await pass(1_500)
    asked[0]!.answer({ kind: 'refused', message: 'Too long.', problems: [] })
    await settled()
    expect(keeper.state).toMatchObject({ name: 'refused', message: 'Too long.' })
    expect(device.copy).toMatchObject({ content: { body: 'too long' } })
    await pass(60_000)
    expect(asked).toHaveLength(1)
    keeper.typed(words('short'))
    await pass(1_500)
    expect(asked).toHaveLength(2)
  })

  it('makes a last try that outlives the page when it is left', async () => {
    const { keeper, asked, device } = bench()
    keeper.leave()
    expect(asked).toEqual([])
    keeper.typed(words('last words'))
    keeper.leave()
    expect(asked).toMatchObject([{ body: 'last words', leaving: true }])
    expect(device.copy).toMatchObject({ content: { body: 'last words' } })
  })

  it('warns before words are lost only when neither the club nor the device has them', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('a'))
    expect(keeper.wouldLose).toBe(false)
    device.full = true
    keeper.typed(words('ab'))
    expect(keeper.wouldLose).toBe(true)
    await pass(1_500)
    asked[0]!.answer({ kind: 'saved', version: 4 })
    await settled()
    expect(keeper.wouldLose).toBe(false)
  })

  it('has nothing to send when words are typed back to what the club has', async () => {
    const { keeper, asked, device, pass } = bench()
    keeper.typed(words('a'))
    keeper.typed(words('club'))
    await pass(60_000)
    expect(asked).toEqual([])
    expect(device.copy).toBeNull()
    expect(keeper.state.name).toBe('saved')
  })

  it('saves at once when asked to, after a save that is already under way', async () => {
    const { keeper, asked, pass } = bench()
    keeper.typed(words('a'))
    await pass(1_500)
    keeper.typed(words('ab'))
    const done = keeper.saveNow()
    asked[0]!.answer({ kind: 'saved', version: 4 })
    await settled()
    expect(asked[1]).toMatchObject({ body: 'ab', version: 4 })
    asked[1]!.answer({ kind: 'saved', version: 5 })
    expect(await done).toBe(true)
  })
})
