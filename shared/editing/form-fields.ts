export { fieldsToGuide, guideToFields }
export type { FormFields }

import { BITES, CAR_CLASSES, SURFACES } from '../vocabulary/conditions.ts'
import type { GuideDraft } from '../schemas/guide-content.ts'
import { guideTextFields } from './guide-fields.ts'

/** The fields of the write form as a browser posts them: flat, every value a text, a tick a field with `yes`. */
type FormFields = Record<string, string>

const EFFECT_CHOICES = ['adjustable', 'direction', 'phase', 'quality', 'change', 'strength', 'basis', 'note'] as const
const EFFECT_TICKS = { surfaces: SURFACES, bites: BITES, carClasses: CAR_CLASSES } as const
const TICKED = 'yes'

/** A guide as the fields of the write form: `title`, `answers.0.heading`, `effects.2.surfaces.loam` and so on. */
function guideToFields(guide: GuideDraft): FormFields {
  const fields: FormFields = {}
  for (const { field, text } of guideTextFields(guide)) {
    const answer = /^answers\.(\d)/.exec(field)?.[1]
    if (answer === undefined || Number(answer) < guide.answers.length) fields[field] = text
  }
  fields['body'] = guide.body
  guide.effects.forEach((effect, n) => {
    for (const key of EFFECT_CHOICES) fields[`effects.${n}.${key}`] = String(effect[key])
    for (const key of Object.keys(EFFECT_TICKS) as (keyof typeof EFFECT_TICKS)[]) {
      for (const value of effect[key]) fields[`effects.${n}.${key}.${value}`] = TICKED
    }
    if (effect.mirrors) fields[`effects.${n}.mirrors`] = TICKED
  })
  guide.sources.forEach((source, n) => {
    fields[`sources.${n}.kind`] = source.kind
    fields[`sources.${n}.text`] = source.text
    fields[`sources.${n}.url`] = source.url
  })
  return fields
}

/**
 * The posted fields as a guide, not yet checked: pass the result to the `GuideDraft` schema. Rows are numbered afresh in
 * the order of their numbers; line ends become `\n`; fields that belong to no guide are left out.
 */
function fieldsToGuide(fields: FormFields): unknown {
  const text = (name: string) => fields[name] ?? ''
  return {
    title: text('title'),
    inShort: text('inShort'),
    answers: rowNumbers(fields, 'answers').map((n) => ({ heading: text(`answers.${n}.heading`), text: text(`answers.${n}.text`) })),
    bench: {
      reachFor: text('bench.reachFor'),
      moveBy: text('bench.moveBy'),
      youGiveUp: text('bench.youGiveUp'),
      takes: text('bench.takes'),
    },
    body: text('body').replace(/\r\n?/g, '\n'),
    effects: rowNumbers(fields, 'effects').map((n) => ({
      ...Object.fromEntries(EFFECT_CHOICES.map((key) => [key, text(`effects.${n}.${key}`)])),
      strength: text(`effects.${n}.strength`) === '' ? '' : Number(text(`effects.${n}.strength`)),
      ...Object.fromEntries(
        Object.entries(EFFECT_TICKS).map(([key, values]) => [
          key,
          values.filter((value) => text(`effects.${n}.${key}.${value}`) === TICKED),
        ]),
      ),
      mirrors: text(`effects.${n}.mirrors`) === TICKED,
    })),
    sources: rowNumbers(fields, 'sources').map((n) => ({
      kind: text(`sources.${n}.kind`),
      text: text(`sources.${n}.text`),
      url: text(`sources.${n}.url`).trim(),
    })),
  }
}

/** The numbers of the rows of one list that a form holds, in order. */
function rowNumbers(fields: FormFields, list: string): string[] {
  const name = new RegExp(`^${list}\\.(\\d{1,4})\\.`)
  const numbers = new Set(Object.keys(fields).flatMap((field) => name.exec(field)?.[1] ?? []))
  return [...numbers].sort((a, b) => Number(a) - Number(b))
}
