export { data }
export type { Data, Marks, WritePage }

import type { PageContextServer } from 'vike/types'
import type { ServiceContext } from '#server/context.ts'
import { getReview, type ReviewView } from '#server/edits/get-review.ts'
import { previewGuide } from '#server/edits/preview-guide.ts'
import type { Preview } from '#server/edits/views.ts'
import { listAdjustables } from '#server/effects/list-adjustables.ts'
import { isAppError } from '#server/errors.ts'
import { getGuide } from '#server/guides/get-guide.ts'
import { forPage } from '#server/http/page-abort.ts'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import { fieldsToGuide } from '#shared/editing/form-fields.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import { previewPage } from '../../parts/guide-preview.ts'
import { plainContent } from '../../parts/plain-content.ts'

type Data = Awaited<ReturnType<typeof data>>
type WritePage = Data & { mode: 'write' }
type Marks = ReturnType<typeof calculatorsToPutIn>

async function data(pageContext: PageContextServer) {
  const { ctx, form, query, routeParams } = pageContext
  return forPage(pageContext, async () => {
    const review = await getReview(ctx, routeParams.id ?? '')
    const shared = { edit: headOf(review), now: ctx.clock().toISOString() }
    // What was typed and refused is never lost, also when the edit can no longer be changed.
    const typed = form === null || !('body' in form.values) ? null : (fieldsToGuide(form.values) as GuideDraft)
    if (!review.may.save) {
      return { mode: 'read' as const, ...shared, changes: review.changes, adjustables: review.adjustables, typed }
    }
    const merging = query.show === 'merge' && review.baseMoved !== null
    const start = typed ?? (merging ? review.baseMoved!.merged : review.content)
    return {
      mode: 'write' as const,
      ...shared,
      kept: { content: review.content, summary: review.summary },
      start: { content: start, summary: form?.values.summary ?? review.summary },
      /** The words below were written on an older version than the club has by now. */
      stale: pageContext.formStatus === 412,
      merge: review.baseMoved === null ? null : await mergeOf(ctx, review, merging),
      adjustables: await listAdjustables(ctx),
      calculators: calculatorsToPutIn(ctx),
      ...(await layOut(ctx, review, start)),
    }
  })
}

function headOf(review: ReviewView) {
  const { id, version, state, title, guide, chapter, summary, baseEdition, createdAt, updatedAt, sentAt, author, notes, reviews, published, may } = review
  return { id, version, state, title, guide, chapter, summary, baseEdition, createdAt, updatedAt, sentAt, author, notes, reviews, published, may }
}

/** The edition published meanwhile; the places to choose in only while they are being settled. */
async function mergeOf(ctx: ServiceContext, { baseMoved, guide }: ReviewView, settling: boolean) {
  const { edition, mergeable, conflicts } = baseMoved!
  if (!settling) return { edition, mergeable, count: conflicts.length, settling: null }
  const published = await getGuide(ctx, guide!.slug)
  const theirs = 'movedTo' in published ? null : plainContent(published)
  return { edition, mergeable, count: conflicts.length, settling: { conflicts, theirs: theirs === null ? null : { effects: theirs.effects, sources: theirs.sources } } }
}

/** The draft as it would be printed. One that cannot be laid out is still there to be written on. */
async function layOut(ctx: ServiceContext, review: ReviewView, start: GuideDraft) {
  const lay = (preview: Preview, content: GuideDraft) =>
    previewPage({ content, mark: review.guide?.mark ?? review.chapter.letter, preview }, ctx.calculators)
  if (start === review.content) {
    return review.proposed === null
      ? { preview: null, unreadable: review.refused.map(({ message }) => message).join(' ') }
      : { preview: lay(review.proposed, start), unreadable: '' }
  }
  try {
    return { preview: lay(await previewGuide(ctx, { content: start }), start), unreadable: '' }
  } catch (error) {
    if (!isAppError(error)) throw error
    return { preview: null, unreadable: error.message }
  }
}

/** What the spine needs to put a calculator in with numbers that work. */
function calculatorsToPutIn({ calculators }: Pick<ServiceContext, 'calculators'>) {
  return [...calculators.values()].map((calculator) => {
    const inputs = calculator.inputs.map(({ key, default: value }) => ({ key, default: value }))
    const run = runDefinition(calculator, Object.fromEntries(inputs.map(({ key, default: value }) => [key, value])))
    const output = calculator.outputs[0]!.key
    return { slug: calculator.slug, title: calculator.title, inputs, output, answer: run.ok ? Number(run.outputs[output]!.toPrecision(4)) : 0 }
  })
}
