export { pairBlocks }

/** Paragraphs less alike than this are shown as one taken out and one put in. */
const LEAST_LIKENESS = 0.35
/** More candidate pairs than this are paired by their order alone. */
const MAX_PAIRS = 900

type Pair = [old: string, fresh: null] | [old: null, fresh: string] | [old: string, fresh: string]

/**
 * Finds which removed paragraph became which added one, keeping both orders: the alignment with the greatest sum of
 * likeness (Dice 1945, on words), by dynamic programming. Every paragraph of both lists is in exactly one pair.
 */
function pairBlocks(removed: readonly string[], added: readonly string[]): Pair[] {
  if (removed.length * added.length > MAX_PAIRS) return pairByOrder(removed, added)
  const likeness = likenessTable(removed, added)
  const rows = removed.length + 1
  const columns = added.length + 1
  const best: number[][] = Array.from({ length: rows }, () => Array<number>(columns).fill(0))
  for (let i = removed.length - 1; i >= 0; i--) {
    for (let j = added.length - 1; j >= 0; j--) {
      const paired = likeness[i]![j]! >= LEAST_LIKENESS ? likeness[i]![j]! + best[i + 1]![j + 1]! : 0
      best[i]![j] = Math.max(paired, best[i + 1]![j]!, best[i]![j + 1]!)
    }
  }
  const pairs: Pair[] = []
  let i = 0
  let j = 0
  while (i < removed.length && j < added.length) {
    const like = likeness[i]![j]!
    if (like >= LEAST_LIKENESS && best[i]![j] === like + best[i + 1]![j + 1]!) pairs.push([removed[i++]!, added[j++]!])
    else if (best[i]![j] === best[i + 1]![j]) pairs.push([removed[i++]!, null])
    else pairs.push([null, added[j++]!])
  }
  while (i < removed.length) pairs.push([removed[i++]!, null])
  while (j < added.length) pairs.push([null, added[j++]!])
  return pairs
}

function pairByOrder(removed: readonly string[], added: readonly string[]): Pair[] {
  const pairs: Pair[] = []
  for (let i = 0; i < Math.max(removed.length, added.length); i++) {
    const old = removed[i]
    const fresh = added[i]
    if (old !== undefined && fresh !== undefined) pairs.push([old, fresh])
    else if (old !== undefined) pairs.push([old, null])
    else if (fresh !== undefined) pairs.push([null, fresh])
  }
  return pairs
}

function likenessTable(removed: readonly string[], added: readonly string[]): number[][] {
  const wordsOf = (block: string) => new Set(block.toLowerCase().match(/[\p{L}\p{N}]+/gu) ?? [])
  const addedWords = added.map(wordsOf)
  return removed.map(wordsOf).map((old) =>
    addedWords.map((fresh) => {
      if (old.size + fresh.size === 0) return 0
      let common = 0
      for (const word of old) if (fresh.has(word)) common += 1
      return (2 * common) / (old.size + fresh.size)
    }),
  )
}
