export { data }
export type { Data }

import { render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { listAdjustables } from '#server/effects/list-adjustables.ts'
import { listLapEffects } from '#server/effects/list-lap-effects.ts'
import { PHASES, phases, type Phase } from '#shared/vocabulary/phases.ts'
import { groupByWish } from './group-by-wish.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx, routeParams }: PageContextServer) {
  const phase = PHASES.find((known) => known === routeParams.phase)
  if (phase === undefined) throw render(404, { message: 'The lap has six parts: entry, middle, exit, straight, bumps and jumps.' })
  const [effects, adjustables] = await Promise.all([listLapEffects(ctx, phase), listAdjustables(ctx)])
  return { phase, ...neighbours(phase), wishes: groupByWish(effects, adjustables) }
}

function neighbours(phase: Phase): { before: Phase | null; after: Phase | null } {
  const at = phases[phase].number - 1
  return { before: PHASES[at - 1] ?? null, after: PHASES[at + 1] ?? null }
}
