export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { byPart } from './by-part.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  const calculators = [...ctx.calculators.values()]
  return {
    count: calculators.length,
    parts: byPart(calculators.map(({ slug, title, purpose, part }) => ({ slug, title, purpose, part }))),
  }
}
