export { loadCalculator }

import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

// One chunk a calculator, so that a page ships only those it shows. The server renders through the same
// loader.
const folders = import.meta.glob<CalculatorDefinition>('../../shared/calculators/*/index.ts', {
  import: 'calculator',
})

/** The definition an instrument is drawn from. Rejects when there is no calculator of that name. */
async function loadCalculator(slug: string): Promise<CalculatorDefinition> {
  const load = folders[`../../shared/calculators/${slug}/index.ts`]
  if (load === undefined) throw new Error(`There is no calculator “${slug}”.`)
  return load()
}
