export { coreLayers }

import type { GuideHistory } from '#server/guides/get-history.ts'

/** The layers of a guide's history as the core sample draws them; `day` puts an instant into words. */
function coreLayers(history: GuideHistory, day: (iso: string) => string) {
  return history.layers.map((layer) => {
    if (layer.kind === 'declined') {
      return {
        edition: null, title: 'An edit was declined', who: 'A member', when: day(layer.at), declinedBy: layer.declinedBy.name, changes: {},
      }
    }
    const { number, summary, author, approver, publishedAt, changes } = layer
    return {
      edition: number,
      title: summary,
      href: number === history.publishedEdition ? `/guides/${history.slug}` : `/guides/${history.slug}/editions/${number}`,
      who: author.name,
      when: day(publishedAt),
      approvedBy: approver.name,
      changes: { words: changes.words, effects: changes.effects, calculator: changes.calculators, pictures: changes.pictures },
      current: number === history.publishedEdition,
    }
  })
}
