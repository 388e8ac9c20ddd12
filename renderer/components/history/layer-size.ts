export { layerBands, layerThickness }
export type { LayerKind, LayerBand }

/** What an edition changed, by kind; the order is the order in which its bands lie. */
type LayerKind = 'calculator' | 'pictures' | 'words' | 'effects'

interface LayerBand {
  kind: LayerKind
  /** Where the band begins and how much of the layer it takes, in per cent. */
  from: number
  share: number
}

/** How many words weigh as much as one effect or one calculator setting. */
const WORDS_A_UNIT = 12

function weight(kind: LayerKind, count: number): number {
  return kind === 'words' ? count / WORDS_A_UNIT : count
}

/** 1 to 5: the more an edition changed, the thicker its layer; each step takes twice as much. */
function layerThickness(changes: Partial<Record<LayerKind, number>>): 1 | 2 | 3 | 4 | 5 {
  const total = Object.entries(changes).reduce((sum, [kind, count]) => sum + weight(kind as LayerKind, count), 0)
  const step = 1 + Math.floor(Math.log2(Math.max(1, total)))
  return Math.min(5, step) as 1 | 2 | 3 | 4 | 5
}

/** The textures of a layer from top to bottom, each with its share; every kind that changed can be seen. */
function layerBands(changes: Partial<Record<LayerKind, number>>): LayerBand[] {
  const kinds = (['calculator', 'pictures', 'words', 'effects'] as const).filter((kind) => (changes[kind] ?? 0) > 0)
  const weights = kinds.map((kind) => Math.max(0.35, Math.sqrt(weight(kind, changes[kind]!))))
  const total = weights.reduce((sum, each) => sum + each, 0)
  let from = 0
  return kinds.map((kind, at) => {
    const share = Math.round((100 * weights[at]!) / total)
    const band = { kind, from, share }
    from += share
    return band
  })
}
