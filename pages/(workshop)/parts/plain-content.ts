export { plainContent }

import type { EffectRow } from '#server/effects/index.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'

/** An edition as an edit would hold it: without the words that its page adds to each effect. */
function plainContent(edition: Omit<GuideDraft, 'effects'> & { effects: readonly EffectRow[] }): GuideDraft {
  const { title, inShort, answers, bench, body, sources } = edition
  const effects = edition.effects.map(({ adjustableName: _name, way: _way, ...effect }) => effect)
  return { title, inShort, answers, bench, body, effects, sources }
}
