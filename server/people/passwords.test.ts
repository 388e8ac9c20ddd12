import argon2 from 'argon2'
import { describe, expect, it } from 'vitest'
import { UNKNOWN_HASH, createPasswords, isWeaker } from './passwords.ts'

const parts = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=(\d+)\$/

describe('passwords', () => {
  it('are kept as argon2id with at least 19 MiB, two passes, one lane', async () => {
    const [, memory, passes, lanes] = parts.exec(await createPasswords().hash('quiet otters eat late')) ?? []
    expect(Number(memory)).toBeGreaterThanOrEqual(19_456)
    expect(Number(passes)).toBeGreaterThanOrEqual(2)
    expect(Number(lanes)).toBe(1)
  })

  it('compares with an equally slow hash where there is no account', () => {
    expect(parts.exec(UNKNOWN_HASH)?.slice(1)).toEqual(['19456', '2', '1'])
    expect(isWeaker(UNKNOWN_HASH)).toBe(false)
  })

  it('never matches where there is no account', async () => {
    expect(await createPasswords().matches(undefined, 'anything at all here')).toBe(false)
  })

  it('takes every byte and every space and case as typed', async () => {
    const passwords = createPasswords()
    const stored = await passwords.hash(`${'a'.repeat(72)}x `)
    const tried = [`${'a'.repeat(72)}x `, `${'a'.repeat(72)}y `, `${'a'.repeat(72)}x`, `${'a'.repeat(72)}X `]
    expect(await Promise.all(tried.map((password) => passwords.matches(stored, password)))).toEqual([true, false, false, false])
  })

  it('takes the two ways to write an accented letter as one', async () => {
    const passwords = createPasswords()
    const stored = await passwords.hash('caf\u00e9 au bord de la piste')
    expect(await passwords.matches(stored, 'cafe\u0301 au bord de la piste')).toBe(true)
  })

  it('knows a hash that was made with less work', async () => {
    expect(isWeaker(await argon2.hash('x', { type: argon2.argon2id, memoryCost: 8_192, timeCost: 2, parallelism: 1 }))).toBe(true)
    expect(isWeaker(await argon2.hash('x', { type: argon2.argon2i, memoryCost: 19_456, timeCost: 2, parallelism: 1 }))).toBe(true)
    expect(isWeaker(await createPasswords().hash('x'))).toBe(false)
  })

  it('turns away whoever comes when two are at work and twenty wait', async () => {
    const passwords = createPasswords()
    const answers = await Promise.allSettled(Array.from({ length: 25 }, () => passwords.hash('quiet otters eat late')))
    const refused = answers.flatMap((answer) => (answer.status === 'rejected' ? [answer.reason as { status: number }] : []))
    expect(refused.map(({ status }) => status)).toEqual([429, 429, 429])
    expect(await passwords.hash('quiet otters eat late')).toMatch(parts)
  })
})
