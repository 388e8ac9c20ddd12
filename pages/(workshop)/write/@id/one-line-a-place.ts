export { oneLineAPlace }

interface Placed {
  message: string
  field?: string
  line?: number
}

/**
 * What is to be mended, as a list to work through: an effect with several open choices is one entry, that leads to the
 * first of them. At the fields themselves each has its own words.
 */
function oneLineAPlace<Problem extends Placed>(problems: readonly Problem[]): Problem[] {
  const seen = new Set<string>()
  return problems.flatMap((problem) => {
    const row = /^effects\.(\d+)\./.exec(problem.field ?? '')
    if (row === null) return [problem]
    if (seen.has(row[1]!)) return []
    seen.add(row[1]!)
    const open = problems.filter(({ field }) => field?.startsWith(row[0])).length
    const name = `Effect ${Number(row[1]) + 1}`
    return [{ ...problem, message: open === 1 ? `${name}. ${problem.message}` : `${name} is not finished: ${open} fields are open.` }]
  })
}
