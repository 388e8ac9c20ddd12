export { guidesDescription }

import { z } from 'zod'
import type { ApiDescription } from '../http/openapi/describe.ts'
import { AdjustableAnswer, ChapterAnswer, ChapterName, EffectAnswer, GlossaryAnswer, GuideAnswer, GuideEntry, HeadingAnswer, PartAnswer, Person } from './answers.ts'
import { GuidesQuery } from './routes.ts'

const guidesDescription: ApiDescription = {
  name: 'Guides',
  about: 'Reading the book.',
  answers: {
    Guide: GuideAnswer,
    GuideEntry,
    Chapter: ChapterAnswer,
    ChapterName,
    Person,
    Effect: EffectAnswer,
    Adjustable: AdjustableAnswer,
    Heading: HeadingAnswer,
    BodyPart: PartAnswer,
    GlossaryTerm: GlossaryAnswer,
  },
  operations: {
    'GET /guides': {
      id: 'listGuides',
      summary: 'The published guides by their marks, fifty a page.',
      query: GuidesQuery,
      answers: { 200: { says: 'One page of guides.', body: z.array(GuideEntry), headers: ['X-Total-Count', 'Link'] } },
    },
    'GET /guides/:slug': {
      id: 'getGuide',
      summary: 'The published edition of a guide.',
      params: { slug: z.string() },
      answers: {
        200: { says: 'The guide.', body: GuideAnswer },
        301: { says: 'The guide has another address now.', headers: ['Location'] },
      },
      problems: { 404: 'There is no such guide.' },
    },
    'GET /chapters': {
      id: 'listChapters',
      summary: 'The chapters, with how many guides each has.',
      answers: { 200: { says: 'Every chapter.', body: z.array(ChapterAnswer) } },
    },
    'GET /glossary': {
      id: 'listTerms',
      summary: 'The terms of the trade, by name.',
      answers: { 200: { says: 'Every term.', body: z.array(GlossaryAnswer) } },
    },
    'GET /adjustables': {
      id: 'listAdjustables',
      summary: 'Everything on the car that can be set, front to rear.',
      answers: { 200: { says: 'Every adjustable.', body: z.array(AdjustableAnswer) } },
    },
  },
}
