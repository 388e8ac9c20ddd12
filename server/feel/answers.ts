export { ByFeelAnswer, byFeelAnswer, FeelChangeAnswer }

import { z } from 'zod'
import { AdjustableAnswer } from '../guides/answers.ts'
import { Effect } from '#shared/schemas/effect.ts'
import { BASES, CHANGES, DIRECTIONS } from '#shared/vocabulary/effect-words.ts'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { QUALITIES } from '#shared/vocabulary/qualities.ts'
import type { FeelAnswer, FeelChange } from './ask-by-feel.ts'

const Because = Effect.omit({ adjustable: true, direction: true }).extend({
  change: z.enum(CHANGES).describe('What it does in this direction; the opposite of what the guide states where mirrored.'),
  mirrored: z.boolean().describe('The guide states it for the opposite direction.'),
  fit: z.number().describe('How well its conditions fit, 0 to 1.'),
  guide: z.object({ slug: z.string(), mark: z.string(), title: z.string() }),
})

const Term = z.object({
  kind: z.enum(['help', 'cost']),
  phase: z.enum(PHASES),
  quality: z.enum(QUALITIES),
  change: z.enum(CHANGES),
  basis: z.enum(BASES),
  mirrored: z.boolean(),
  weight: z.number().describe('Sum of strength × fit over the effects that say so.'),
  trust: z.number(),
  value: z.number().describe('weight × trust, negative where it makes a complaint worse.'),
})

const FeelChangeAnswer = z.object({
  adjustable: z.string(),
  name: z.string(),
  direction: z.enum(DIRECTIONS),
  way: z.string().describe('The direction in the adjustable’s own words.'),
  step: z.number().describe('The usual small step, in `unit`.'),
  unit: z.string(),
  score: z.number().describe('help − 0.35 × cost.'),
  help: z.number(),
  cost: z.number(),
  trust: z.number().describe('Mean trust of the effects that help, each by its weight.'),
  minutes: z.number(),
  fits: z.boolean().describe('Whether it can be done in the minutes that were given; true when none were.'),
  tools: AdjustableAnswer.shape.tools,
  guide: z.string().nullable().describe('Slug of the guide about it.'),
  reports: z.object({ helped: z.int(), same: z.int(), worse: z.int() }),
  sure: z.enum(['settled', 'leaning', 'split', 'thin']),
  terms: z.array(Term).describe('Every term of the score, largest first.'),
  because: z.array(Because).describe('The published effects behind the terms, those that weigh most first.'),
})

const ByFeelAnswer = z.object({ changes: z.array(FeelChangeAnswer), more: z.int().describe('How many further changes would help.') })

function byFeelAnswer({ changes, more, query }: FeelAnswer): z.output<typeof ByFeelAnswer> {
  return { changes: changes.map((change) => changeAnswer(change, query.minutes)), more }
}

function changeAnswer(change: FeelChange, available: number | undefined): z.output<typeof FeelChangeAnswer> {
  const { adjustable, direction, words, score, help, cost, trust, minutes, reports, sure, terms, evidence, guide } = change
  return {
    adjustable, direction, score, help, cost, trust, minutes, reports, sure, terms,
    name: words.name,
    way: words[direction],
    step: words.smallStep,
    unit: words.unit,
    fits: available === undefined || minutes <= available,
    tools: words.tools,
    guide,
    because: evidence.map(({ effect, change: does, mirrored, fit, guide: from }) => {
      const { phase, quality, strength, surfaces, bites, carClasses, mirrors, basis, note } = effect
      return { phase, quality, change: does, strength, surfaces, bites, carClasses, mirrors, basis, note, mirrored, fit, guide: from }
    }),
  }
}
