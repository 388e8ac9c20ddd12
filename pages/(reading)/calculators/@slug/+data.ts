export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { getCalculator } from '#server/calculators/service.ts'
import { listGuidesUsingCalculator } from '#server/guides/list-guides-using-calculator.ts'
import { forPage } from '#server/http/page-abort.ts'
import { parametersFor } from '#shared/calculators/query.ts'
import type { InstrumentProps } from '#renderer/calculators/instrument-props.ts'
import { partNames } from '../by-part.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const { slug, title, purpose, part } = await forPage(pageContext, () => getCalculator(ctx.calculators, routeParams.slug ?? ''))
  const guides = await listGuidesUsingCalculator(ctx, slug)
  const instrument: InstrumentProps = {
    slug, instanceId: slug, action: `/calculators/${slug}`, headingLevel: 2, values: parametersFor(query, slug),
  }
  return { title, purpose, part: partNames[part], instrument, guides }
}
