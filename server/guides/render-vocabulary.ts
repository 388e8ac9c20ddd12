export { loadRenderVocabulary }

import type { CalculatorRegistry } from '../calculators/load-registry.ts'
import type { Database } from '../db/client.ts'
import { adjustables, glossaryTerms } from '../db/schema/index.ts'
import type { RenderVocabulary } from '../rendering/index.ts'
import { endsOf } from '#shared/calculators/ends.ts'
import { unitById } from '#shared/units/units.ts'

/** Everything a guide's body may refer to, as plain data for the rendering threads. */
async function loadRenderVocabulary(db: Database, calculators: CalculatorRegistry): Promise<RenderVocabulary> {
  const terms = await db.select({ key: glossaryTerms.key, term: glossaryTerms.term, short: glossaryTerms.short }).from(glossaryTerms)
  const keys = await db.select({ key: adjustables.key }).from(adjustables)
  return {
    calculators: [...calculators.values()].map(({ slug, title, inputs, outputs }) => ({
      slug,
      title,
      inputs: inputs.map(({ key, min, max, unit }) => ({ key, min, max, unit: unitById(unit).written })),
      outputs: outputs.map(({ key, unit }) => ({ key, unit: unitById(unit).written })),
      ends: endsOf({ inputs }),
    })),
    glossary: Object.fromEntries(terms.map(({ key, term, short }) => [key, { term, short }])),
    adjustables: keys.map(({ key }) => key),
  }
}
