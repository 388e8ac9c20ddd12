export { getGlossary }
export type { GlossaryTerm }

import { asc } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { glossaryTerms } from '../db/schema/index.ts'
import type { GlossaryAnswer } from './answers.ts'

type GlossaryTerm = z.infer<typeof GlossaryAnswer>

async function getGlossary(ctx: Pick<ServiceContext, 'db'>): Promise<GlossaryTerm[]> {
  return ctx.db.select().from(glossaryTerms).orderBy(asc(glossaryTerms.term))
}
