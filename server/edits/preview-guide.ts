export { previewGuide, previewOf }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { effectRow, findAdjustables } from '../effects/index.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { holdsBack } from '../rendering/index.ts'
import { isWholeEffect } from '#shared/schemas/effect.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import { renderBody } from './check-content.ts'
import { PreviewInput } from './inputs.ts'
import type { Preview } from './views.ts'
import { runWorkedExamples } from '#shared/guides/worked-examples.ts'

/**
 * A draft exactly as publishing would store it: the same renderer, the same words for effects.
 * @throws ValidationError or the renderer's refusal (422), at the field
 */
async function previewGuide(ctx: ServiceContext, input: z.input<typeof PreviewInput>): Promise<Preview> {
  requirePermission(ctx.actor, 'preview.render')
  await ctx.rateLimits.take('preview', ctx.actor.id)
  const { content } = parseInput(PreviewInput, input)
  return previewOf(ctx, content, ctx.actor.id)
}

/** @param owner the member who looks at it: nobody has more than a few being made at once */
async function previewOf(ctx: ServiceContext, content: GuideDraft, owner: string): Promise<Preview> {
  const { html, parts, headings, problems } = await renderBody(ctx, content.body, { owner })
  const named = parts.flatMap((part) => (part.kind === 'effects' ? [part.adjustable] : []))
  // An unfinished effect says nothing yet, so there is nothing to lay out.
  const effects = content.effects.filter(isWholeEffect)
  const adjustables = await findAdjustables(ctx, [...effects.map((effect) => effect.adjustable), ...named])
  const byKey = new Map(adjustables.map((adjustable) => [adjustable.key, adjustable]))
  return {
    html,
    parts,
    headings,
    effects: effects.map((effect) => effectRow(effect, byKey.get(effect.adjustable))),
    problems: problems.map((problem) => ({ ...problem, holds: holdsBack(problem) })),
    workedExamples: runWorkedExamples(ctx, parts),
    adjustables,
  }
}
