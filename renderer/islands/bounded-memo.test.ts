import { expect, it } from 'vitest'
import { createBoundedMemo } from './bounded-memo.ts'

/** A memo and what it had to make, in order. */
function watched(most: number) {
  const made: string[] = []
  const memo = createBoundedMemo(most)
  const get = (key: string) =>
    memo.get(key, async () => {
      made.push(key)
      return `<${key}>`
    })
  return { get, made }
}

it('makes a text once', async () => {
  const { get, made } = watched(100)
  expect([await get('a'), await get('a'), await get('b')]).toEqual(['<a>', '<a>', '<b>'])
  expect(made).toEqual(['a', 'b'])
})

it('keeps no more than it may, and forgets what was not asked for longest', async () => {
  const { get, made } = watched(6)
  for (const key of ['a', 'b', 'a', 'c', 'a', 'b']) await get(key)
  expect(made).toEqual(['a', 'b', 'c', 'b'])
})

it('hands out a text that is too long to keep', async () => {
  const { get, made } = watched(2)
  expect([await get('a'), await get('a')]).toEqual(['<a>', '<a>'])
  expect(made).toEqual(['a', 'a'])
})

it('counts a text once that was made twice at the same time', async () => {
  const { get, made } = watched(6)
  await Promise.all([get('a'), get('a')])
  await get('b')
  await get('a')
  expect(made).toEqual(['a', 'a', 'b'])
})

it('keeps nothing that could not be made', async () => {
  const memo = createBoundedMemo(100)
  await expect(memo.get('a', () => Promise.reject(new Error('no')))).rejects.toThrow('no')
  expect(await memo.get('a', async () => 'now')).toBe('now')
})
