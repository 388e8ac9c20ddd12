export { parseAttributes }

const SPACE = /\s/
const KEY = /[A-Za-z][A-Za-z0-9_-]*/y
const BARE_VALUE = /[^\s"'=<>`{}]+/y
const WORD = /\S+/y

/**
 * Reads what stands between the braces of a directive: `key=value` and `key="a value"`, separated by spaces.
 * Stricter than the proposal: a guide has no use for `#id`, `.class` or a key without a value, and a slip of
 * the keyboard should be told rather than guessed at.
 *
 * @returns the attributes that were well written, and one sentence for each thing that was not
 */
function parseAttributes(text: string): { attributes: Map<string, string>; faults: string[] } {
  const attributes = new Map<string, string>()
  const faults: string[] = []
  let position = 0

  const take = (pattern: RegExp): string | null => {
    pattern.lastIndex = position
    const match = pattern.exec(text)
    if (match === null) return null
    position = pattern.lastIndex
    return match[0]
  }

  while (position < text.length) {
    if (SPACE.test(text[position]!)) {
      position += 1
      continue
    }
    const start = position
    const key = take(KEY)
    if (key === null || text[position] !== '=') {
      position = start
      faults.push(`“${take(WORD)}” is not understood here: write key=value or key="some words".`)
      continue
    }
    position += 1
    const value = takeValue()
    if (value === null) {
      take(WORD)
      faults.push(`“${text.slice(start, position)}” has no readable value: write ${key}=value or ${key}="some words".`)
    } else if (attributes.has(key)) {
      faults.push(`“${key}” is given twice; the first one counts.`)
    } else {
      attributes.set(key, value)
    }
  }
  return { attributes, faults }

  function takeValue(): string | null {
    const quote = text[position]
    if (quote !== '"' && quote !== "'") {
      const value = take(BARE_VALUE)
      return endsHere() ? value : null
    }
    const end = text.indexOf(quote, position + 1)
    if (end === -1) return null
    const value = text.slice(position + 1, end)
    position = end + 1
    return endsHere() ? value : null
  }

  function endsHere(): boolean {
    return position === text.length || SPACE.test(text[position]!)
  }
}
