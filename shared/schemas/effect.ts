export { Effect, EffectDraft, ADJUSTABLE_KEY, isWholeEffect }

import { z } from 'zod'
import { BITES, CAR_CLASSES, SURFACES } from '../vocabulary/conditions.ts'
import { BASES, CHANGES, DIRECTIONS } from '../vocabulary/effect-words.ts'
import { PHASES } from '../vocabulary/phases.ts'
import { QUALITIES } from '../vocabulary/qualities.ts'
import { asTyped } from './as-typed.ts'
import { optionalText } from './text.ts'

const ADJUSTABLE_KEY = /^[a-z][a-z0-9_]{1,39}$/

function oneOf<const T extends readonly [string, ...string[]]>(values: T, what: string) {
  return z.enum(values, { error: `${what}: choose one from the list.` })
}

function someOf<const T extends readonly [string, ...string[]]>(values: T, what: string) {
  return z
    .array(oneOf(values, what))
    .max(values.length, { error: `${what}: each can be named once.` })
    .refine((list) => new Set(list).size === list.length, { error: `${what}: each can be named once.` })
    .default([])
}

/**
 * One statement of what a change does: this adjustable, moved this way, does this to that quality, in this part of the
 * lap, this strongly, under these conditions. Empty conditions mean any.
 */
const Effect = z.strictObject({
  adjustable: z.string().regex(ADJUSTABLE_KEY, { error: 'What you change: choose one from the list.' }),
  direction: oneOf(DIRECTIONS, 'Which way'),
  phase: oneOf(PHASES, 'Where on the lap'),
  quality: oneOf(QUALITIES, 'What changes'),
  change: oneOf(CHANGES, 'More or less'),
  strength: z.union([z.literal(1), z.literal(2), z.literal(3)], {
    error: 'How strongly: choose a touch, clearly or a lot.',
  }),
  surfaces: someOf(SURFACES, 'Surface'),
  bites: someOf(BITES, 'Bite'),
  carClasses: someOf(CAR_CLASSES, 'Class'),
  mirrors: z.boolean({ error: 'The other way does the opposite: yes or no.' }).default(true),
  basis: oneOf(BASES, 'How we know'),
  note: optionalText('Note', 200),
})
type Effect = z.infer<typeof Effect>

/** A choice that may not have been made yet; the empty text says so, as it does in the form. */
function orOpen<Choice extends z.ZodType>(choice: Choice) {
  const wrong = choice.safeParse('?').error!.issues[0]!.message
  return z.union([z.literal(''), choice], { error: wrong }).default('')
}

/** An effect half filled in: a draft holds it as it is, only sending asks for the rest. */
const EffectDraft = z.strictObject({
  adjustable: orOpen(Effect.shape.adjustable),
  direction: orOpen(Effect.shape.direction),
  phase: orOpen(Effect.shape.phase),
  quality: orOpen(Effect.shape.quality),
  change: orOpen(Effect.shape.change),
  strength: orOpen(Effect.shape.strength),
  surfaces: Effect.shape.surfaces,
  bites: Effect.shape.bites,
  carClasses: Effect.shape.carClasses,
  mirrors: Effect.shape.mirrors,
  basis: orOpen(Effect.shape.basis),
  note: asTyped('Note'),
})
type EffectDraft = z.infer<typeof EffectDraft>

/** Whether every choice of an effect is made, so that it can be shown and read as one. */
function isWholeEffect(effect: EffectDraft): effect is Effect {
  const { adjustable, direction, phase, quality, change, strength, basis } = effect
  return [adjustable, direction, phase, quality, change, strength, basis].every((choice) => choice !== '')
}
