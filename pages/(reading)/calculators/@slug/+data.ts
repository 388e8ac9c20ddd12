export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { getCalculator } from '#server/calculators/service.ts'
import { chosenCar } from '#server/cars/list-cars.ts'
import { listGuidesUsingCalculator } from '#server/guides/list-guides-using-calculator.ts'
import { forPage } from '#server/http/page-abort.ts'
import { parametersFor } from '#shared/calculators/query.ts'
import type { InstrumentProps } from '#renderer/calculators/instrument-props.ts'
import { partLetters, partNames } from '../by-part.ts'
import { firstSentence } from '../first-sentence.ts'
import { loadDerivation } from './load-derivation.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const { slug, title, purpose, part, limits, sources } = await forPage(pageContext, () =>
    getCalculator(ctx.calculators, routeParams.slug ?? ''),
  )
  const [guides, derivation, car] = await Promise.all([listGuidesUsingCalculator(ctx, slug), loadDerivation(slug), chosenCar(ctx)])
  const instrument: InstrumentProps = {
    slug, instanceId: slug, action: `/calculators/${slug}`, headingLevel: 2, values: parametersFor(query, slug),
    ...(car && { car }),
  }
  const related = [...ctx.calculators.values()]
    .filter((other) => other.part === part && other.slug !== slug)
    .map((other) => ({ slug: other.slug, title: other.title, answers: firstSentence(other.purpose) }))
  return {
    title, purpose, limits, sources, derivation, guides, related, instrument,
    part: { name: partNames[part], letter: partLetters[part] },
  }
}
