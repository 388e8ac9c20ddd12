export { matchBrackets }

/** Brackets, backslashes and backticks: all that matters for which bracket closes which. */
const BACKSLASH = 92
const BACKTICK = 96
const OPEN = 91
const CLOSE = 93

/**
 * For each `[` the `]` that closes it. A backslash takes a bracket's meaning away, and code spans bind
 * tighter than brackets, as everywhere in CommonMark. One pass over the text, so that a text of nothing but
 * brackets stays cheap.
 */
function matchBrackets(source: string): Map<number, number> {
  const closes = new Map<number, number>()
  const open: number[] = []
  const codeSpanEnd = codeSpanFinder(source)
  for (let position = 0; position < source.length; position += 1) {
    switch (source.charCodeAt(position)) {
      case BACKSLASH:
        position += 1
        break
      case BACKTICK:
        position = codeSpanEnd(position) - 1
        break
      case OPEN:
        open.push(position)
        break
      case CLOSE: {
        const start = open.pop()
        if (start !== undefined) closes.set(start, position)
        break
      }
    }
  }
  return closes
}

/**
 * Finds where the code span ends that opens at a backtick: after the next run of exactly as many backticks,
 * or after the opening run itself when there is none. To be asked at rising positions.
 */
function codeSpanFinder(source: string): (position: number) => number {
  const startsByLength = new Map<number, number[]>()
  for (const run of source.matchAll(/`+/g)) {
    const starts = startsByLength.get(run[0].length)
    if (starts === undefined) startsByLength.set(run[0].length, [run.index])
    else starts.push(run.index)
  }
  for (const starts of startsByLength.values()) starts.reverse()

  return (position) => {
    let end = position
    while (source.charCodeAt(end) === BACKTICK) end += 1
    const length = end - position
    const starts = startsByLength.get(length) ?? []
    while (starts.length > 0 && starts.at(-1)! < end) starts.pop()
    return starts.length === 0 ? end : starts.at(-1)! + length
  }
}
