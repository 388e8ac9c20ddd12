export { checkContent, renderBody }
export type { CheckedContent }

import type { ServiceContext } from '../context.ts'
import { adjustables } from '../db/schema/index.ts'
import { AppError, ValidationError, isAppError, type FieldProblem } from '../errors.ts'
import { holdsBack, type RenderOrder, type RenderResult } from '../rendering/index.ts'
import { guideProblems, oneForEachField } from '#shared/editing/guide-problems.ts'
import { withoutEmptyRows } from '#shared/editing/whole-rows.ts'
import { GuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { missedExamples, runWorkedExamples } from '#shared/guides/worked-examples.ts'

interface CheckedContent {
  content: GuideContent
  rendering: RenderResult
}

/**
 * Whether a draft could be published as it is: whole, with effects on things that exist, a body that renders with all that it
 * asks for, and worked examples that match. What the renderer only remarks on is shown to writer and moderator, who judge.
 * Renders the body, so it is called before a transaction, never inside one.
 * @param besides what is to be mended outside the guide itself, so that all of it is named at once
 * @throws ValidationError (422) that names every field to mend, each once; places in the body have their lines
 */
async function checkContent(
  ctx: Pick<ServiceContext, 'db' | 'renderer' | 'calculators'>,
  draft: GuideDraft,
  besides: readonly FieldProblem[] = [],
): Promise<CheckedContent> {
  const content = GuideContent.safeParse(withoutEmptyRows(draft))
  const problems: FieldProblem[] = oneForEachField([...guideProblems(draft), ...(await unknownAdjustables(ctx, draft))])
    .map(({ field, message }) => ({ field: `content.${field}`, message }))
  problems.push(...besides)
  const rendering = draft.body.trim() === '' ? null : await renderBody(ctx, draft.body, { urgent: true }).catch((error: unknown) => {
    if (problems.length === 0 || !isAppError(error) || error.status !== 422) throw error
    problems.push(...error.fields)
    return null
  })
  if (rendering !== null) {
    const said = rendering.problems.filter(holdsBack).map((problem) => `Line ${problem.line}: ${problem.message}`)
    const missed = missedExamples(runWorkedExamples(ctx, rendering.parts))
    for (const message of [...said, ...missed]) problems.push({ field: 'content.body', message })
  }
  if (!content.success || rendering === null || problems.length > 0) {
    throw new ValidationError(`${problems.length === 1 ? 'One thing has' : `${problems.length} things have`} to be mended first.`, problems)
  }
  return { content: content.data, rendering }
}

async function unknownAdjustables(ctx: Pick<ServiceContext, 'db'>, { effects }: GuideDraft): Promise<FieldProblem[]> {
  const known = new Set((await ctx.db.select({ key: adjustables.key }).from(adjustables)).map((row) => row.key))
  return effects.flatMap(({ adjustable }, n) =>
    known.has(adjustable) ? [] : [{ field: `effects.${n}.adjustable`, message: 'What you change: choose one from the list.' }],
  )
}

/** Renders a body; what the renderer refuses is said at the field where the body stands. */
async function renderBody(ctx: Pick<ServiceContext, 'renderer'>, body: string, order: RenderOrder): Promise<RenderResult> {
  try {
    return await ctx.renderer.render(body, order)
  } catch (error) {
    if (!isAppError(error)) throw error
    const fields = error.fields.map(({ field, message }) => ({ field: field === 'body' ? 'content.body' : field, message }))
    throw new AppError(error.code, error.status, error.message, { fields, details: error.details, cause: error })
  }
}
