export { GuideContent, GuideDraft, Source, emptyGuideContent, GUIDE_LIMITS }

import { z } from 'zod'
import { SOURCE_KINDS } from '../vocabulary/source-kinds.ts'
import { asTyped, asTypedLines } from './as-typed.ts'
import { Effect, EffectDraft } from './effect.ts'
import { byteLength, cleanText, optionalText } from './text.ts'

/** Limits that a writer meets; named here so that form, service and help text say the same. */
const GUIDE_LIMITS = {
  title: 90,
  inShort: 280,
  answerHeading: 40,
  answerText: 240,
  bench: 300,
  bodyBytes: 64 * 1024,
  effects: 60,
  sources: 40,
  sourceText: 400,
  summary: 140,
} as const

/** All of a draft as JSON: a whole body with its line ends escaped, and as much again around it. */
const DRAFT_BYTES = 256 * 1024

const Source = z.strictObject({
  kind: z.enum(SOURCE_KINDS, { error: 'Kind of source: choose one from the list.' }),
  text: cleanText('Source', 3, GUIDE_LIMITS.sourceText),
  url: z
    .union([z.literal(''), z.url({ protocol: /^https?$/, error: 'Address: it has to begin with https:// or http://.' })])
    .default(''),
})
type Source = z.infer<typeof Source>

const Answer = z.strictObject({
  heading: cleanText('Heading of a short answer', 2, GUIDE_LIMITS.answerHeading),
  text: cleanText('Short answer', 10, GUIDE_LIMITS.answerText),
})

const Bench = z.strictObject({
  reachFor: optionalText('When to reach for it', GUIDE_LIMITS.bench),
  moveBy: optionalText('How much to move it', GUIDE_LIMITS.bench),
  youGiveUp: optionalText('What you give up', GUIDE_LIMITS.bench),
  takes: optionalText('How long it takes', GUIDE_LIMITS.bench),
})

const emptyBench = { reachFor: '', moveBy: '', youGiveUp: '', takes: '' }

const body = z
  .string({ error: 'Body: write some text.' })
  .refine((text) => !text.includes('\u0000'), { error: 'Body: it holds a character that cannot be stored.' })
  .refine((text) => byteLength(text) <= GUIDE_LIMITS.bodyBytes, {
    error: 'Body: it is longer than 64 KiB. Split it into two guides.',
  })

const answersOf = <Row extends z.ZodType>(row: Row) =>
  z.array(row).max(2, { error: 'Short answers: two at most, one for each way.' }).default([])
const effectsOf = <Row extends z.ZodType>(row: Row) =>
  z.array(row).max(GUIDE_LIMITS.effects, { error: 'Effects: 60 at most in one guide.' }).default([])
const sourcesOf = <Row extends z.ZodType>(row: Row) =>
  z.array(row).max(GUIDE_LIMITS.sources, { error: 'Sources: 40 at most.' }).default([])

/** All that a guide says, as one value: what an edit hands in and what an edition publishes. */
const GuideContent = z.strictObject({
  title: cleanText('Title', 3, GUIDE_LIMITS.title),
  inShort: cleanText('In short', 20, GUIDE_LIMITS.inShort),
  answers: answersOf(Answer),
  bench: Bench.default(emptyBench),
  body: body.refine((text) => text.trim() !== '', { error: 'Body: write some text.' }),
  effects: effectsOf(Effect),
  sources: sourcesOf(Source),
})
type GuideContent = z.infer<typeof GuideContent>

/**
 * A guide half written, as it was typed: anything may be missing, too long or unfinished, so that a draft can always be
 * saved. Only what no guide could ever hold is refused. What has to be mended, {@link GuideContent} says.
 */
const GuideDraft = z
  .strictObject({
    title: asTyped('Title'),
    inShort: asTypedLines('In short'),
    answers: answersOf(z.strictObject({ heading: asTyped('Heading of a short answer'), text: asTypedLines('Short answer') })),
    bench: z
      .strictObject({
        reachFor: asTypedLines('When to reach for it'),
        moveBy: asTypedLines('How much to move it'),
        youGiveUp: asTypedLines('What you give up'),
        takes: asTypedLines('How long it takes'),
      })
      .default(emptyBench),
    body: body.default(''),
    effects: effectsOf(EffectDraft),
    sources: sourcesOf(Source.extend({ text: asTyped('Source'), url: asTyped('Address') })),
  })
  .refine((draft) => byteLength(JSON.stringify(draft)) <= DRAFT_BYTES, {
    path: ['body'],
    error: 'Body: the whole draft is longer than 256 KiB. Split it into two guides.',
  })
type GuideDraft = z.infer<typeof GuideDraft>

function emptyGuideContent(): GuideDraft {
  return { title: '', inShort: '', answers: [], bench: { ...emptyBench }, body: '', effects: [], sources: [] }
}
