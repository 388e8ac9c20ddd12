export { data }
export type { Data, ToChoose, ToReport }

import type { PageContextServer } from 'vike/types'
import { findAdjustables } from '#server/effects/find-adjustables.ts'
import { listAdjustables } from '#server/effects/list-adjustables.ts'
import { countsFor } from '#server/heat-reports/counts-for.ts'
import { ownReportOn } from '#server/heat-reports/list-heat-reports.ts'
import { forPage } from '#server/http/page-abort.ts'
import { safeNext } from '#server/people/safe-next.ts'
import { readFeelQuery } from '#shared/feel/feel-query.ts'
import { agreeing, reportCount, sureOf } from '#shared/feel/trust.ts'
import { readChange } from '#shared/heat-reports/report-address.ts'

type Data = Awaited<ReturnType<typeof data>>
type ToChoose = Extract<Data, { change: null }>
type ToReport = Extract<Data, { change: object }>

const WAYS = ['up', 'down'] as const

async function data(pageContext: PageContextServer) {
  const { ctx, urlParsed, form } = pageContext
  const asked = urlParsed.search
  const { class: carClass, surface, bite } = { ...asked, ...form?.values }
  const { query: conditions } = readFeelQuery({ class: carClass, surface, bite })
  const change = readChange(asked['change'])
  const [adjustable] = change === undefined ? [] : await findAdjustables(ctx, [change.adjustable])
  const chosen = { carClass: conditions.carClass ?? '', surface: conditions.surface ?? '', bite: conditions.bite ?? '' }
  const back = asked['back'] === undefined ? null : safeNext(asked['back'])
  if (change === undefined || adjustable === undefined) {
    return { change: null, choices: await choicesOf(ctx), unknown: asked['change'] ?? '', chosen, back }
  }
  const [counts, own] = await forPage(pageContext, () => Promise.all([countsFor(ctx, change, conditions), ownReportOn(ctx, change, conditions)]))
  const said = form === null && own !== undefined ? asked['said'] : undefined
  return {
    change: { key: asked['change']!, name: adjustable.name, way: adjustable[change.direction], about: adjustable.about },
    chosen,
    back,
    said: said === 'saved' || said === 'changed' ? said : null,
    own: own === undefined ? null : { verdict: own.verdict, note: own.note, setAside: own.setAside },
    counts: { ...counts, all: reportCount(counts), agree: agreeing(counts), sure: sureOf(counts) },
  }
}

async function choicesOf(ctx: PageContextServer['ctx']) {
  const all = await listAdjustables(ctx)
  return all.map((each) => ({
    name: each.name,
    choices: WAYS.map((way) => ({ value: `${each.key}.${way}`, text: `${each.name}: ${each[way]}` })),
  }))
}
