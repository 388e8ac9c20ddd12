export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { byPart } from '../by-part.ts'
import { findAmong, searchWords } from '../find-calculators.ts'
import { firstSentence } from '../first-sentence.ts'

type Data = Awaited<ReturnType<typeof data>>

const longestQuestion = 100

async function data({ ctx, urlParsed }: PageContextServer) {
  const question = (urlParsed.search['find'] ?? '').slice(0, longestQuestion)
  const calculators = [...ctx.calculators.values()].map((calculator) => ({
    slug: calculator.slug,
    title: calculator.title,
    answers: firstSentence(calculator.purpose),
    part: calculator.part,
    example: exampleAnswer(calculator),
    words: searchWords(calculator),
  }))
  const found = new Set(findAmong(calculators, question).map(({ slug }) => slug))
  return {
    question,
    count: calculators.length,
    found: found.size,
    parts: byPart(calculators.map((calculator) => ({ ...calculator, shown: found.has(calculator.slug) }))),
  }
}

/** What it answers for the usual values: a look at the answer before the question. */
function exampleAnswer(calculator: CalculatorDefinition): string {
  const run = runDefinition(calculator, {})
  return run.ok ? plainSentence(calculator.answer(run.inputs, run.outputs).says) : ''
}
