export { getGlossary }
export type { GlossaryTerm }

import { asc } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { glossaryTerms } from '../db/schema/index.ts'

interface GlossaryTerm {
  key: string
  term: string
  short: string
  long: string
  standard: string
}

async function getGlossary(ctx: Pick<ServiceContext, 'db'>): Promise<GlossaryTerm[]> {
  return ctx.db.select().from(glossaryTerms).orderBy(asc(glossaryTerms.term))
}
