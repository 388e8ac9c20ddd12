export { indexVocabulary }
export type { VocabularyIndex }

import type { CalculatorVocabulary, RenderVocabulary } from './types.ts'

/** The vocabulary as maps, so that a name such as `constructor` finds nothing. */
interface VocabularyIndex {
  calculators: Map<string, CalculatorVocabulary>
  adjustables: Set<string>
  /** From a key, or a term as people write it in lower case, to the glossary key. */
  glossaryKeys: Map<string, string>
}

function indexVocabulary(vocabulary: RenderVocabulary): VocabularyIndex {
  const entries = Object.entries(vocabulary.glossary)
  return {
    calculators: new Map(vocabulary.calculators.map((calculator) => [calculator.slug, calculator])),
    adjustables: new Set(vocabulary.adjustables),
    glossaryKeys: new Map([
      ...entries.map(([key, { term }]) => [term.toLowerCase(), key] as const),
      ...entries.map(([key]) => [key, key] as const),
    ]),
  }
}
