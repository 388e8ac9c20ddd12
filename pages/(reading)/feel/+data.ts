export { data }
export type { Data, Try }

import type { PageContextServer } from 'vike/types'
import { askByFeel, listFirstLooks, type FeelChange } from '#server/feel/index.ts'
import { buildLapRows, type LapRow } from '#shared/effects/lap-rows.ts'
import { readFeelQuery } from '#shared/feel/feel-query.ts'
import { complaintKey } from '#shared/vocabulary/complaints.ts'
import { orderOf, sortTries } from './orders.ts'

type Data = Awaited<ReturnType<typeof data>>
type Try = ReturnType<typeof tryOf>

async function data({ ctx, urlParsed: { searchAll: address } }: PageContextServer) {
  const { complaint, class: carClass, surface, bite, minutes } = address
  const { query, problems } = readFeelQuery({ complaint, class: carClass, surface, bite, minutes })
  const [answer, looks] = await Promise.all([askByFeel(ctx, query), listFirstLooks(ctx, query.complaints)])
  const order = orderOf(address['order']?.[0])
  return {
    query,
    problems: problems.map(({ message }) => message),
    order,
    more: answer.more,
    looks: looks.map(({ says }) => says),
    tries: sortTries(answer.changes.map(tryOf), order),
    chosen: query.complaints.map(complaintKey),
  }
}

/** One change as a row shows it; only what is shown crosses into the page. */
function tryOf({ words, direction, guide: slug, score, help, cost, trust, minutes, sure, agree, reported, terms, evidence, effects }: FeelChange) {
  const row: LapRow | undefined = buildLapRows(effects, [words]).find((each) => each.direction === direction)
  const guide = evidence.find((each) => each.guide.slug === slug)?.guide ?? evidence[0]?.guide ?? null
  const helping = terms.filter(({ kind, value }) => kind === 'help' && value > 0)
  const helpful = evidence
    .filter(({ effect, change }) => helping.some((term) => term.phase === effect.phase && term.quality === effect.quality && term.change === change))
    .sort((a, b) => b.effect.strength - a.effect.strength)
  const helps = helpful
    .map(({ effect: { phase, quality, strength }, change }) => ({ phase, quality, strength, change }))
    .filter(({ phase, quality }, at, all) => all.findIndex((each) => each.phase === phase && each.quality === quality) === at)
  const note = helpful.find(({ mirrored, effect }) => !mirrored && effect.note !== '')?.effect.note ?? ''
  return {
    key: `${words.key}-${direction}`,
    adjustable: words.key,
    direction,
    name: words.name,
    way: words[direction],
    step: { smallStep: words.smallStep, unit: words.unit },
    about: words.about,
    opensCar: words.opensCar,
    tools: words.tools,
    minutes, score, help, cost, trust, sure, agree, reported, terms, row, guide, note, helps,
    because: evidence.map(({ effect, change, mirrored, fit, guide: from }) => {
      const { phase, quality, strength, basis, surfaces, bites, carClasses } = effect
      return { phase, quality, change, strength, basis, surfaces, bites, carClasses, mirrored, fit, guide: from }
    }),
  }
}
