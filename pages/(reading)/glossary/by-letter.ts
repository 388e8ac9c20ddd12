export { byLetter }

/** Terms under their first letter, A to Z; what begins with a figure or a sign stands first, under “#”. */
function byLetter<T extends { term: string }>(terms: readonly T[]): { letter: string; terms: T[] }[] {
  const groups = new Map<string, T[]>()
  for (const term of [...terms].sort((a, b) => a.term.localeCompare(b.term, 'en', { sensitivity: 'base', numeric: true }))) {
    const letter = letterOf(term.term)
    const group = groups.get(letter)
    if (group === undefined) groups.set(letter, [term])
    else group.push(term)
  }
  return [...groups].map(([letter, found]) => ({ letter, terms: found })).sort((a, b) => (a.letter < b.letter ? -1 : 1))
}

function letterOf(term: string): string {
  const first = term.normalize('NFKD').charAt(0).toUpperCase()
  return /[A-Z]/.test(first) ? first : '#'
}
