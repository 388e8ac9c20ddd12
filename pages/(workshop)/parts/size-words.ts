export { sizeWords }

import type { ChangeSizes } from '#shared/editing/compare-guides.ts'

const names: Record<keyof ChangeSizes, [one: string, many: string]> = {
  fields: ['field', 'fields'],
  words: ['word', 'words'],
  effects: ['effect', 'effects'],
  calculators: ['calculator', 'calculators'],
  pictures: ['picture', 'pictures'],
  sources: ['source', 'sources'],
}

/** How much an edit changes, kind by kind, leaving out what it does not touch. */
function sizeWords(sizes: ChangeSizes): { key: string; count: number; name: string }[] {
  return (Object.keys(names) as (keyof ChangeSizes)[])
    .filter((key) => sizes[key] > 0)
    .map((key) => ({ key, count: sizes[key], name: names[key][sizes[key] === 1 ? 0 : 1] }))
}
