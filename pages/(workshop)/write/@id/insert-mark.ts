export { insertMark, lineRange }
export type { Mark, Inserted }

/** Something that can be put into a guide's text. `|…|` in the skeleton is what the writer changes first. */
interface Mark {
  skeleton: string
  /** A block stands on lines of its own with a blank line on both sides. */
  block: boolean
}

interface Inserted {
  text: string
  /** What to select afterwards, so that typing on fills the skeleton in. */
  from: number
  to: number
}

/**
 * Puts a mark into a text where the cursor is. Words that were selected go inside an inline mark; a block is put after
 * the line they stand on.
 */
function insertMark(text: string, from: number, to: number, mark: Mark): Inserted {
  return mark.block ? insertBlock(text, to, mark.skeleton) : insertInline(text, from, to, mark.skeleton)
}

function insertInline(text: string, from: number, to: number, skeleton: string): Inserted {
  const [before, placeholder, after] = takeApart(skeleton)
  const words = text.slice(from, to) || placeholder
  const start = from + before.length
  return { text: text.slice(0, from) + before + words + after + text.slice(to), from: start, to: start + words.length }
}

function insertBlock(text: string, at: number, skeleton: string): Inserted {
  const lineEnd = text.indexOf('\n', at)
  const place = isBlankLine(text, at) ? at : lineEnd === -1 ? text.length : lineEnd
  const head = text.slice(0, place).replace(/\n+$/, '')
  const tail = text.slice(place).replace(/^\n+/, '')
  const [before, placeholder, after] = takeApart(skeleton)
  const lead = head === '' ? '' : `${head}\n\n`
  const start = lead.length + before.length
  return { text: `${lead}${before}${placeholder}${after}\n${tail === '' ? '' : `\n${tail}`}`, from: start, to: start + placeholder.length }
}

function isBlankLine(text: string, at: number): boolean {
  const start = text.lastIndexOf('\n', at - 1) + 1
  const end = text.indexOf('\n', at)
  return text.slice(start, end === -1 ? text.length : end).trim() === ''
}

function takeApart(skeleton: string): [before: string, placeholder: string, after: string] {
  const [before = '', placeholder = '', after = ''] = skeleton.split('|')
  return [before, placeholder, after]
}

/** Where a line stands in a text, without its line end; lines count from 1 and one that is too far is the last. */
function lineRange(text: string, line: number): { from: number; to: number } {
  let from = 0
  for (let at = 1; at < line; at++) {
    const end = text.indexOf('\n', from)
    if (end === -1) break
    from = end + 1
  }
  const end = text.indexOf('\n', from)
  return { from, to: end === -1 ? text.length : end }
}
