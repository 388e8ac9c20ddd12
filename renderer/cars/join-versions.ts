export { joinVersions }

import type { CarValues, EnteredCarKey } from '#shared/cars/car-values.ts'

/**
 * Puts together what two places made of the same car: where only one changed a value that one counts, where both did the
 * value is disputed and `mine` stands for now.
 */
function joinVersions(base: CarValues, mine: CarValues, theirs: CarValues): { values: CarValues; disputed: EnteredCarKey[] } {
  const keys = new Set([...Object.keys(base), ...Object.keys(mine), ...Object.keys(theirs)]) as Set<EnteredCarKey>
  const values: CarValues = {}
  const disputed: EnteredCarKey[] = []
  for (const key of keys) {
    const changed = mine[key] !== base[key]
    if (changed && theirs[key] !== base[key] && mine[key] !== theirs[key]) disputed.push(key)
    const value = changed ? mine[key] : theirs[key]
    if (value !== undefined) values[key] = value
  }
  return { values, disputed }
}
