export { ApprovalAnswer, BaseMovedAnswer, ChangeSizesAnswer, ConflictAnswer, EditAnswer, EditEntryAnswer, PreviewAnswer, SentAnswer, WorkedExampleAnswer }

import { z } from 'zod'
import { AdjustableAnswer, ChapterName, EffectAnswer, HeadingAnswer, PartAnswer, Person } from '../guides/answers.ts'
import { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { MergeConflict } from '#shared/editing/merge-guides.ts'
import type { WorkedExample } from '#shared/guides/worked-examples.ts'
import { EDIT_STATES } from '#shared/vocabulary/edit-states.ts'
import type { BaseMoved, EditEntry, EditView, Preview } from './views.ts'

/** What the API answers about edits; the services' types are checked against it. */

const moment = z.iso.datetime()

const ChangeSizesAnswer = z.object({
  words: z.int().describe('Words put in, taken out or replaced.'),
  fields: z.int(),
  effects: z.int(),
  calculators: z.int().describe('Calculators and worked examples put in, taken out or set differently.'),
  pictures: z.int(),
  sources: z.int(),
}) satisfies z.ZodType<ChangeSizes>

const EditEntryAnswer = z.object({
  id: z.uuid(),
  version: z.int().describe('Rises with every change of text or state; the ETag.'),
  state: z.enum(EDIT_STATES),
  title: z.string().describe('As the edit would have it; empty while a new guide has no title yet.'),
  guide: z.object({ slug: z.string(), mark: z.string(), title: z.string() }).nullable().describe('The guide it improves; null for a new one.'),
  chapter: ChapterName,
  author: Person,
  summary: z.string(),
  baseEdition: z.int().nullable().describe('Number of the edition it started from.'),
  createdAt: moment,
  updatedAt: moment,
  sentAt: moment.nullable(),
  changes: ChangeSizesAnswer.nullable().describe('Against the edition it started from, as handed in; null while it is being written.'),
  asked: z.object({ reason: z.string(), reviewer: Person }).nullable().describe('What a moderator asks for, while it is back with its writer.'),
}) satisfies z.ZodType<EditEntry>

const ConflictAnswer = z.object({
  field: z.string(),
  label: z.string(),
  base: z.string(),
  mine: z.string(),
  theirs: z.string(),
}) satisfies z.ZodType<MergeConflict>

// `merged` holds both where they do not conflict.
const BaseMovedAnswer = z.object({
  edition: z.int(),
  mergeable: z.boolean(),
  merged: GuideDraft,
  conflicts: z.array(ConflictAnswer),
}) satisfies z.ZodType<BaseMoved>

const EditAnswer = EditEntryAnswer.extend({
  content: GuideDraft,
  author: Person.extend({ approvedEdits: z.int() }),
  notes: z.array(z.object({ id: z.uuid(), author: Person, text: z.string(), createdAt: moment })),
  reviews: z.array(
    z.object({ decision: z.enum(['approve', 'ask', 'decline']), reason: z.string(), reviewer: Person, version: z.int(), decidedAt: moment }),
  ),
  baseMoved: BaseMovedAnswer.nullable().describe('Not null when another edition was published since the edit began.'),
  published: z.object({ slug: z.string(), edition: z.int() }).nullable().describe('Where it stands in the book, once approved.'),
  may: z
    .object({
      save: z.boolean(),
      send: z.boolean(),
      withdraw: z.boolean(),
      decide: z.boolean(),
      note: z.boolean(),
      rebase: z.boolean(),
      merge: z.boolean(),
    })
    .describe('What the person who asks may do with it now.'),
}) satisfies z.ZodType<EditView>

const SentAnswer = EditAnswer.extend({ merged: z.boolean().describe('Whether a newer edition was put in.') })

const ApprovalAnswer = z.object({ edit: EditAnswer, slug: z.string(), edition: z.int() })

const WorkedExampleAnswer = z.object({
  n: z.int().describe('Number of its part in the body.'),
  slug: z.string(),
  calculator: z.string(),
  inputs: z.record(z.string(), z.number()),
  output: z.string(),
  unit: z.string(),
  says: z.number(),
  gives: z.number().nullable(),
  allowed: z.number().describe('As a fraction, like `offBy`.'),
  offBy: z.number().nullable(),
  matches: z.boolean(),
}) satisfies z.ZodType<WorkedExample>

const PreviewAnswer = z.object({
  html: z.string(),
  parts: z.array(PartAnswer),
  headings: z.array(HeadingAnswer),
  effects: z.array(EffectAnswer),
  problems: z.array(
    z.object({
      line: z.int().describe('In the Markdown, from 1.'),
      code: z.string(),
      message: z.string(),
      holds: z.boolean().describe('Whether it has to be mended before the edit can be sent.'),
    }),
  ),
  workedExamples: z.array(WorkedExampleAnswer),
  adjustables: z.array(AdjustableAnswer),
}) satisfies z.ZodType<Preview>
