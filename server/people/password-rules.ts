export { PASSWORD_LENGTH, findPasswordProblem, requireGoodPassword }
export type { PasswordOwner }

import { ValidationError } from '../errors.ts'
import { textLength } from '#shared/schemas/text.ts'
import { COMMON_WORDS, KEY_ROWS } from './common-passwords.ts'

/**
 * In code points. NIST SP 800-63B-4 asks for 15 where the password is all that protects an account; 128 is far more than
 * anyone types, and bounds the work.
 */
const PASSWORD_LENGTH = { min: 15, max: 128 } as const

/** Whose password it will be: words that a stranger would try first. */
interface PasswordOwner {
  name: string
  email: string
  clubName: string
}

// What has to be left of a password once the words everyone would guess are taken out of it.
const OWN_PART = 8

/**
 * Says what is wrong with a new password, or nothing. There are no rules about what kinds of characters it must hold.
 * @returns a sentence for the person, or undefined when the password is good
 */
function findPasswordProblem(password: string, owner: PasswordOwner): string | undefined {
  const length = textLength(password.normalize('NFC'))
  if (length < PASSWORD_LENGTH.min) {
    return `Password: use at least ${PASSWORD_LENGTH.min} characters. Shorter ones are on the lists that are tried first. Five words in a row do it.`
  }
  if (length > PASSWORD_LENGTH.max) return `Password: use ${PASSWORD_LENGTH.max} characters at most.`
  const folded = fold(password)
  if (isRepeated(folded)) return 'Password: it says the same thing again and again, which is tried first. Use different words.'
  if (isTypedAlongKeys(folded)) return 'Password: it runs along the keyboard or the alphabet, which is tried first. Use words.'
  if (leavesTooLittle(folded, COMMON_WORDS)) {
    return 'Password: it is put together from the commonest passwords, which are tried first. Use words of your own.'
  }
  if (leavesTooLittle(folded, wordsAbout(owner))) {
    return 'Password: it is little more than your name, your address or the name of this book. Use other words.'
  }
  return undefined
}

/** @throws ValidationError (422) at the field */
function requireGoodPassword(password: string, owner: PasswordOwner, field = 'password'): void {
  const problem = findPasswordProblem(password, owner)
  if (problem !== undefined) throw new ValidationError('Choose another password.', [{ field, message: problem }])
}

/** Lower case, without accents, spaces and punctuation: how alike passwords are compared. */
function fold(text: string): string {
  return text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[\p{M}\s\p{P}]+/gu, '')
}

function isRepeated(folded: string): boolean {
  const characters = [...folded]
  if (characters.length === 0 || new Set(characters).size < 5) return true
  const longestPart = Math.min(10, Math.floor(characters.length / 2))
  for (let part = 1; part <= longestPart; part += 1) {
    if (characters.every((character, i) => i < part || character === characters[i - part])) return true
  }
  return false
}

const neighbours = new Set(
  KEY_ROWS.flatMap((row) => [...row].slice(1).flatMap((key, i) => [`${row[i] ?? ''}${key}`, `${key}${row[i] ?? ''}`])),
)

// In English about one pair of letters in ten are neighbours on a keyboard or in the alphabet.
const SHARE_OF_NEIGHBOURS = 0.65

function isTypedAlongKeys(folded: string): boolean {
  const characters = [...folded]
  const steps = characters.slice(1).filter((key, i) => key === characters[i] || neighbours.has(`${characters[i] ?? ''}${key}`))
  return steps.length >= SHARE_OF_NEIGHBOURS * (characters.length - 1)
}

/** Whether little but figures remains when the words are taken out, also when written with figures for letters. */
function leavesTooLittle(folded: string, words: readonly string[]): boolean {
  return [folded, readFiguresAsLetters(folded)].some((text) => {
    const longestFirst = [...words].sort((a, b) => b.length - a.length)
    const rest = longestFirst.reduce((left, word) => left.replaceAll(word, ' '), text)
    return rest !== text && textLength(rest.replace(/[\s\d]+/g, '')) < OWN_PART
  })
}

const lettersForFigures: Record<string, string> = { '0': 'o', '1': 'l', '3': 'e', '4': 'a', '5': 's', '7': 't', '$': 's' }

function readFiguresAsLetters(folded: string): string {
  return folded.replace(/[013457$]/g, (figure) => lettersForFigures[figure] ?? figure)
}

// Three letters would be met by chance inside other words.
const SHORTEST_WORD = 4

function wordsAbout({ name, email, clubName }: PasswordOwner): string[] {
  const localPart = email.slice(0, email.lastIndexOf('@'))
  const words = [localPart, name, clubName, 'Camber & Clay', 'Camber and Clay'].flatMap((text) => [
    fold(text),
    ...text.split(/[^\p{L}\p{N}]+/u).map(fold),
  ])
  return [...new Set(words)].filter((word) => word.length >= SHORTEST_WORD)
}
