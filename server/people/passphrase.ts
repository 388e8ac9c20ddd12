export { readyPassphrase }

import { randomInt } from 'node:crypto'
import { PASSPHRASE_WORDS } from './passphrase-words.ts'

/** Six words of 256 are 48 bits, behind argon2id and a limit of five tries in a quarter of an hour. */
const READY_WORDS = 6

/** A password to take as it is: words from the track with spaces between, chosen by the system's random numbers. */
function readyPassphrase(): string {
  return Array.from({ length: READY_WORDS }, () => PASSPHRASE_WORDS[randomInt(PASSPHRASE_WORDS.length)]).join(' ')
}
