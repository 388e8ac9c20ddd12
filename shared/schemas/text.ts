export { cleanText, optionalText, textLength, byteLength }

import { z } from 'zod'

/** Length as a reader would count it: in code points, not in UTF-16 units. */
function textLength(text: string): number {
  return [...text].length
}

/** Bytes of the text in UTF-8, which is what storage and the renderer's gate count. */
function byteLength(text: string): number {
  return new TextEncoder().encode(text).length
}

// Control characters have no place in a title or a name, and can forge mail headers or log lines.
const controlCharacters = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/

/**
 * One line of text: trimmed, without control characters, between `min` and `max` characters.
 * @param what The field's name as it stands above the field, used in the message.
 */
function cleanText(what: string, min: number, max: number) {
  return z
    .string({ error: `${what}: write some text.` })
    .trim()
    .normalize('NFC')
    .refine((text) => !/\p{Surrogate}/u.test(text), { error: `${what}: it holds half a character, which cannot be stored.` })
    .refine((text) => !controlCharacters.test(text), { error: `${what}: keep it on one line.` })
    .refine((text) => textLength(text) >= min, {
      error: min <= 1 ? `${what}: write something here.` : `${what}: write at least ${min} characters.`,
    })
    .refine((text) => textLength(text) <= max, { error: `${what}: keep it under ${max + 1} characters.` })
}

/** As {@link cleanText}, but may be left empty. */
function optionalText(what: string, max: number) {
  return cleanText(what, 0, max).default('')
}
