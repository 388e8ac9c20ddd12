export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { getGlossary } from '#server/guides/get-glossary.ts'
import { byLetter } from './by-letter.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  const terms = await getGlossary(ctx)
  return { letters: byLetter(terms), count: terms.length }
}
