export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { getReview } from '#server/edits/get-review.ts'
import { getEdition } from '#server/guides/get-edition.ts'
import { forPage } from '#server/http/page-abort.ts'
import { previewPage, type GuidePreview } from '../../parts/guide-preview.ts'
import { exampleSentence, exampleWords } from '#renderer/guides/example-words.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, reader, routeParams } = pageContext
  return forPage(pageContext, async () => {
    const review = await getReview(ctx, routeParams.id ?? '')
    const { id, version, state, title, guide, chapter, author, summary, baseEdition, sentAt, notes, reviews, may, published } = review
    const mark = guide?.mark ?? chapter.letter
    const moved = review.baseMoved
    return {
      edit: { id, version, state, title, guide, chapter, author, summary, baseEdition, sentAt, notes, reviews, may, published },
      now: ctx.clock().toISOString(),
      isMine: author.id === reader?.id,
      view: ['published', 'proposed'].includes(query.view ?? '') ? query.view! : 'marked',
      changes: review.changes,
      adjustables: review.adjustables,
      proposed: review.proposed === null ? null : previewPage({ content: review.content, mark, preview: review.proposed }, ctx.calculators),
      published: await publishedPage(),
      refused: review.refused.map(({ message }) => message),
      problems: review.proposed?.problems.map(({ line, message, holds }) => ({ line, message, holds })) ?? [],
      examples: (review.proposed?.workedExamples ?? []).map((example) => {
        const words = exampleWords(example, ctx.calculators.get(example.slug))
        return { n: words.n, matches: words.matches, verdict: words.verdict, words: exampleSentence(words) }
      }),
      baseMoved: moved === null ? null : { edition: moved.edition, mergeable: moved.mergeable, conflicts: moved.conflicts },
    }

    /** The edition that the edit started from, laid out as its page is; null for a new guide. */
    async function publishedPage(): Promise<GuidePreview | null> {
      if (guide === null || baseEdition === null) return null
      const edition = await getEdition(ctx, { slug: guide.slug, number: baseEdition })
      if ('movedTo' in edition) return null
      return previewPage({ content: edition, mark, preview: { ...edition, problems: [], workedExamples: [] } }, ctx.calculators)
    }
  })
}
