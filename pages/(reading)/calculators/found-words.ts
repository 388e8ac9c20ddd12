export { foundWords }

/** What a search of the shelf came to, in words; empty while nothing is asked. */
function foundWords(question: string, found: number): string {
  if (question.trim() === '') return ''
  if (found === 0) return `Nothing answers “${question}” yet.`
  return `${found} ${found === 1 ? 'calculator' : 'calculators'} for “${question}”.`
}
