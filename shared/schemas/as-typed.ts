export { asTyped, asTypedLines, TYPED_LIMIT }

import { z } from 'zod'
import { textLength } from './text.ts'

/** The most that one short field of a draft keeps, far above what a guide takes: it is there against abuse, not for style. */
const TYPED_LIMIT = 4_000

/** A line as it was typed, however long or unfinished; only what cannot be stored, or is no line, is refused. */
function asTyped(what: string) {
  return kept(what).refine((text) => !/[\n\r]/.test(text), { error: `${what}: keep it on one line.` }).default('')
}

/** As {@link asTyped}, for a field in which Enter makes a new line. */
function asTypedLines(what: string) {
  return kept(what).overwrite((text) => text.replace(/\r\n?/g, '\n')).default('')
}

function kept(what: string) {
  return z
    .string({ error: `${what}: write some text.` })
    .trim()
    .normalize('NFC')
    .refine((text) => !text.includes('\u0000'), { error: `${what}: it holds a character that cannot be stored.` })
    .refine((text) => textLength(text) <= TYPED_LIMIT, { error: `${what}: a draft keeps ${TYPED_LIMIT.toLocaleString('en-GB')} characters here. Shorten it, or put it into the text.` })
}
