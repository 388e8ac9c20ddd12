export { loadDerivation }

import type { Derivation } from '#shared/calculators/derivation.ts'

// Read by +data.ts on the server alone: where a formula comes from is never sent to the browser as code.
const files = import.meta.glob<Derivation>('../../../../shared/calculators/*/derivation.ts', {
  import: 'derivation',
})

/** Where the formula of a calculator comes from; undefined while nobody has written it. */
async function loadDerivation(slug: string): Promise<Derivation | undefined> {
  return files[`../../../../shared/calculators/${slug}/derivation.ts`]?.()
}
