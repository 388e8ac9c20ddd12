import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readyPassphrase } from './passphrase.ts'
import { findPasswordProblem } from './password-rules.ts'

const owner = { name: 'Priya Haldane', email: 'priya.haldane@club.example', clubName: 'Saltmarsh Flats R/C' }
const problem = (password: string) => findPasswordProblem(password, owner)

// Fifteen code points that are no word, no run and no repeat.
const unlike = 'm7 gvK2xq-Tz9wb4Jd fRh3Yp6'

describe('length', () => {
  it.each([
    [14, 'at least 15'],
    [15, undefined],
    [64, undefined],
    [128, undefined],
    [129, '128 characters at most'],
  ])('%i characters: %s', (length, expected) => {
    const text = Array.from({ length }, (_, i) => String.fromCodePoint(0x4e00 + i * 7)).join('')
    if (expected === undefined) expect(problem(text)).toBeUndefined()
    else expect(problem(text)).toContain(expected)
  })

  it('counts code points, so that a character outside the basic plane is one', () => {
    const cars = ['🏎', '🏁', '🔧', '🔩', '🛞', '🚗', '🚙', '🛻', '🏆', '⏱', '🧰', '🪛', '🔋', '🛠']
    expect(problem(cars.join(''))).toContain('at least 15')
    expect(problem([...cars, '🎯'].join(''))).toBeUndefined()
  })

  it('counts a letter and its accent as one, however they were typed', () => {
    expect(problem('e\u0301'.repeat(14))).toContain('at least 15')
  })
})

describe('what characters it holds', () => {
  it.each(['quiet otters eat late', '     wet   grip    ', 'verylongbutallsmallletters', unlike, '82 61 94 70 35 16', 'ゆっくり曲がってから全開で飛ぶのが好き'])(
    'is free: %j',
    (password) => {
      expect(problem(password)).toBeUndefined()
    },
  )
})

describe('what is tried first', () => {
  it.each([
    'aaaaaaaaaaaaaaa', 'abababababababab', 'abcabcabcabcabc', 'passwordpassword', 'Password Password', 'pancake-pancake-pancake',
    '123456789012345', '098765432109876', 'qwertyuiopasdfgh', 'QWERTYUIOP[]asdf', 'abcdefghijklmnop', 'zyxwvutsrqponmlk',
    '1qaz2wsx3edc4rfv', '1q2w3e4r5t6y7u8i', '111111111111112', 'aaaaaaabbbbbbbbb',
    'password12345678', 'P@ssw0rd123456789', 'iloveyouforever1', 'welcome to football 1', 'letmein letmein please', 'adminadmin2024!!',
  ])('is refused with its reason: %j', (password) => {
    expect(problem(password)).toContain('tried first')
  })

  it.each(['camber and clay 1', 'Saltmarsh Flats 99', 'priya.haldane.2024', 'Priya Haldane 1987', 'haldanepriya!!!!'])(
    'so is little more than whose it is or what it is for: %j',
    (password) => {
      expect(problem(password)).toContain('little more than')
    },
  )

  it('leaves a good password alone that holds a name or a common word', () => {
    expect(problem('priya weighs every diff twice')).toBeUndefined()
    expect(problem('welcome back on the wet clay')).toBeUndefined()
  })
})

describe('the ready passphrase', () => {
  it('is always good, and never twice the same', () => {
    const ready = Array.from({ length: 2_000 }, readyPassphrase)
    expect(ready.map(problem).filter((found) => found !== undefined)).toEqual([])
    expect(new Set(ready).size).toBe(ready.length)
  })
})

it('has an answer for every text', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (password) => {
      expect(['string', 'undefined']).toContain(typeof problem(password))
    }),
  )
})
