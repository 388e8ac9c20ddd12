export {
  AdjustableAnswer, ChapterAnswer, ChapterName, EffectAnswer, GlossaryAnswer, GuideAnswer, GuideEntry, HeadingAnswer, PartAnswer, Person,
}

import { z } from 'zod'
import type { AdjustableView, EffectRow } from '../effects/index.ts'
import type { Heading } from '../rendering/index.ts'
import { Effect } from '#shared/schemas/effect.ts'
import { GuideContent } from '#shared/schemas/guide-content.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'
import { CAR_ENDS } from '#shared/cars/car-ends.ts'
import { AXLES } from '#shared/vocabulary/axles.ts'

/** What the API answers about the book; the services' types are read from these schemas, or checked against them. */

const Person = z.object({ id: z.uuid(), name: z.string() })

const ChapterName = z.object({ letter: z.string(), name: z.string() })

const ChapterAnswer = ChapterName.extend({
  about: z.string(),
  guides: z.int().describe('How many guides are published in it.'),
  wanted: z.int().describe('How many guides it still lacks.'),
})

const GlossaryAnswer = z.object({ key: z.string(), term: z.string(), short: z.string(), long: z.string(), standard: z.string() })

const AdjustableAnswer = z.object({
  key: z.string(),
  name: z.string(),
  axle: z.enum(AXLES).describe('Which end of the car it belongs to.'),
  unit: z.string(),
  up: z.string().describe('What its two directions are called, such as thicker and thinner.'),
  down: z.string(),
  smallStep: z.number().describe('The usual small step, in `unit`.'),
  minutes: z.number(),
  tools: z.array(z.string()),
  opensCar: z.boolean(),
  guide: z.string().nullable().describe('Slug of the guide about it.'),
  about: z.string(),
}) satisfies z.ZodType<AdjustableView>

const EffectAnswer = Effect.extend({
  adjustableName: z.string(),
  way: z.string().describe('The direction in the adjustable’s own words.'),
}) satisfies z.ZodType<EffectRow>

const GuideEntry = z.object({
  slug: z.string(),
  mark: z.string().describe('Chapter letter and a number that never changes, such as B2.'),
  title: z.string(),
  inShort: z.string(),
  chapter: z.string().describe('Letter of its chapter.'),
  edition: z.int().describe('Number of the published edition.'),
})

const HeadingAnswer = z.object({ level: z.int(), id: z.string(), text: z.string() }) satisfies z.ZodType<Heading>

const numbers = z.record(z.string(), z.number())

const PartAnswer = z.discriminatedUnion('kind', [
  z.object({ n: z.int(), kind: z.literal('calculator'), slug: z.string(), preset: numbers, end: z.enum(CAR_ENDS).optional() }),
  z.object({ n: z.int(), kind: z.literal('effects'), adjustable: z.string() }),
  z.object({
    n: z.int(),
    kind: z.literal('worked'),
    slug: z.string(),
    inputs: numbers,
    expect: z.object({ key: z.string(), value: z.number() }),
    tolerance: z.number().describe('How far off the answer may be, as a fraction.'),
  }),
]) satisfies z.ZodType<RenderedPart>

/** One edition of a guide with all that its page shows. */
const GuideAnswer = GuideContent.extend({
  id: z.uuid(),
  slug: z.string(),
  mark: z.string(),
  number: z.int(),
  chapter: ChapterName,
  html: z.string().describe('The body as the page shows it, with an empty element for each of `parts`.'),
  parts: z.array(PartAnswer),
  headings: z.array(HeadingAnswer),
  effects: z.array(EffectAnswer),
  adjustables: z.array(AdjustableAnswer).describe('Everything that its effects or its text speak of.'),
  edition: z.int(),
  editions: z.int().describe('How many editions there are.'),
  summary: z.string(),
  author: Person,
  approver: Person,
  contributors: z.array(Person.extend({ editions: z.int() })).describe('Everyone who wrote an edition up to this one, most editions first.'),
  publishedAt: z.iso.datetime(),
  firstPublishedAt: z.iso.datetime(),
})
