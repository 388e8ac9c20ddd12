export { previewPage }
export type { GuidePreview }

import type { Preview } from '#server/edits/views.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { Source, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { guidePage, type GuidePage } from '#renderer/guides/guide-page.ts'
import { exampleSentence, exampleWords } from '#renderer/guides/example-words.ts'

/** A guide as its page would print it, without the people and numbers that only an edition has. */
interface GuidePreview
  extends Pick<GuidePage, 'mark' | 'title' | 'inShort' | 'answers' | 'benchFacts' | 'lap' | 'segments' | 'sources'> {
  problems: { line: number; message: string; holds: boolean }[]
  /** Worked examples that do not match, in words, out of how many. */
  missed: string[]
  workedExamples: number
}

const nobody = { id: '', name: '' }

/** Lays a draft out by the same rule as a published guide; runs on the server and in the browser alike. */
function previewPage(
  { content, mark, preview }: { content: GuideDraft; mark: string; preview: Preview },
  calculators: ReadonlyMap<string, CalculatorDefinition>,
): GuidePreview {
  const page = guidePage(
    { calculators },
    {
      ...content,
      ...preview,
      answers: content.answers.filter(({ heading, text }) => heading !== '' || text !== ''),
      sources: content.sources.filter(({ text }) => text !== '').map((source) => ({ ...source, url: webAddress(source.url) })),
      slug: '', mark, chapter: { letter: '', name: '' },
      edition: 0, editions: 0, author: nobody, approver: nobody, contributors: [], publishedAt: '', firstPublishedAt: '',
    },
    { path: '', query: {} },
  )
  return {
    mark: page.mark, title: page.title, inShort: page.inShort, answers: page.answers, benchFacts: page.benchFacts,
    // Choosing a ground would ask the address of this page for it, and there is no such thing here.
    lap: page.lap === null ? null : { ...page.lap, grounds: [] },
    segments: page.segments, sources: page.sources,
    problems: preview.problems.map(({ line, message, holds }) => ({ line, message, holds })),
    missed: preview.workedExamples
      .filter(({ matches }) => !matches)
      .map((example) => exampleSentence(exampleWords(example, calculators.get(example.slug)))),
    workedExamples: preview.workedExamples.length,
  }
}

/** A draft keeps whatever stands in the field; only what would be published becomes a link. */
function webAddress(url: string): string {
  return Source.shape.url.safeParse(url).data ?? ''
}
