export { CreateInput, DecisionInput, MergeInput, NoteInput, PreviewInput, ReasonInput, SaveInput, SendInput, Summary, VersionInput }

import { z } from 'zod'
import { SLUG } from '../guides/slug.ts'
import { asTyped } from '#shared/schemas/as-typed.ts'
import { GUIDE_LIMITS, GuideDraft } from '#shared/schemas/guide-content.ts'
import { cleanText } from '#shared/schemas/text.ts'

const version = z.int({ error: 'Version: a whole number.' }).min(-1)
const slug = z.string().regex(SLUG, { error: 'Guide: there is none with this address.' })
const edition = z.int({ error: 'Edition: a whole number.' }).min(1).max(2_147_483_647)
const Summary = cleanText('What you changed', 3, GUIDE_LIMITS.summary)

// Half of a pair of UTF-16 units is no character, and PostgreSQL's jsonb refuses it.
const brokenCharacter = /\p{Surrogate}/u
const BROKEN = 'It holds a broken character. Delete it and type it again.'

/** The same line while the draft is being written: it may still be missing or too long. */
const SummaryDraft = asTyped('What you changed').unwrap().refine((text) => !brokenCharacter.test(text), { error: `What you changed: ${BROKEN}` })

function refuseBrokenCharacters(value: unknown, ctx: z.RefinementCtx, path: PropertyKey[] = []): void {
  if (typeof value === 'string' && brokenCharacter.test(value)) ctx.addIssue({ code: 'custom', path, message: BROKEN })
  if (typeof value !== 'object' || value === null) return
  for (const [key, part] of Object.entries(value)) refuseBrokenCharacters(part, ctx, [...path, key])
}

/** Line ends become `\n` whatever was sent, so that comparing never sees a difference that nobody can see. */
const content = GuideDraft.superRefine((draft, ctx) => refuseBrokenCharacters(draft, ctx)).transform((draft) => ({ ...draft, body: draft.body.replace(/\r\n?/g, '\n') }))

/**
 * Several lines of a person's own words.
 * @param what the field's label as it stands above the field
 */
const words = (what: string, min: number) => {
  const say = (rest: string) => (what.endsWith('?') ? `${what} ${rest.slice(0, 1).toUpperCase()}${rest.slice(1)}` : `${what}: ${rest}`)
  return z
    .string({ error: say('write some text.') })
    .transform((text) => text.replace(/\r\n?/g, '\n').trim())
    .refine((text) => !/[\u0000-\u0008\u000b-\u001f\u007f]/.test(text), { error: say('it holds a character that cannot be stored.') })
    .refine((text) => !brokenCharacter.test(text), { error: say(BROKEN) })
    .refine((text) => [...text].length >= min, { error: say(`write at least ${min} character${min === 1 ? '' : 's'}.`) })
    .refine((text) => [...text].length <= 2_000, { error: say('keep it under 2,001 characters.') })
}

const CreateInput = z.union(
  [
    z.strictObject({ guideSlug: slug, restoreEdition: edition.optional() }),
    z.strictObject({
      chapter: z.string().regex(/^[A-Z]$/, { error: 'Chapter: choose one from the list.' }),
      wanted: z.uuid({ error: 'Wanted guide: there is none with this id.' }).optional(),
    }),
  ],
  { error: 'Say which guide to improve, or in which chapter a new one belongs.' },
)
const SaveInput = z.strictObject({ version, content, summary: SummaryDraft.default('') })
const SendInput = z.strictObject({ version, summary: SummaryDraft.optional() })
const MergeInput = z.strictObject({ version, baseEdition: edition, content, summary: SummaryDraft.optional() })
const VersionInput = z.strictObject({ version })
const DecisionInput = z.strictObject({ version, note: words('Note', 0).default('') })
const ReasonInput = z.strictObject({ version, reason: words('What should change, or why not?', 3) })
const NoteInput = z.strictObject({ text: words('Note', 1) })
const PreviewInput = z.strictObject({ content })
