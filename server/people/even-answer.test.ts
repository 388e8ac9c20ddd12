import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { evenAnswer } from './even-answer.ts'

const waits = vi.hoisted(() => [] as number[])
vi.mock('node:timers/promises', () => ({
  setTimeout: (milliseconds: number) => {
    waits.push(milliseconds)
    return Promise.resolve()
  },
}))

let now = 0
beforeEach(() => {
  waits.length = 0
  now = 1_000
  vi.spyOn(performance, 'now').mockImplementation(() => now)
})
afterEach(() => vi.restoreAllMocks())

it.each([
  [0, 150],
  [40, 110],
  [149, 1],
])('waits for the rest of the time after %i ms of work', async (took, rest) => {
  await evenAnswer(150, async () => {
    now += took
  })
  expect(waits).toEqual([rest])
})

it('also waits when the work failed', async () => {
  const failing = evenAnswer(150, async () => {
    now += 10
    throw new Error('no')
  })
  await expect(failing).rejects.toThrow('no')
  expect(waits).toEqual([140])
})

it('does not wait when the work took longer', async () => {
  expect(await evenAnswer(150, async () => (now += 151))).toBe(1_151)
  expect(waits).toEqual([])
})
