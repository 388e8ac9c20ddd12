export { headingOf, linesOf, splitBlocks }

/**
 * Splits Markdown into paragraphs, each with the blank lines after it, so that the blocks joined give the text again.
 * Blank lines before the first paragraph are a block of their own.
 */
function splitBlocks(text: string): string[] {
  const blocks: string[] = []
  let block = ''
  let ended = false
  for (const line of linesOf(text)) {
    const blank = line.trim() === ''
    if (ended && !blank) {
      blocks.push(block)
      block = ''
    }
    block += line
    ended = blank
  }
  if (block !== '') blocks.push(block)
  return blocks
}

/** Lines with their line ends, so that joining them gives the text again. */
function linesOf(text: string): string[] {
  return text.match(/[^\n]*\n|[^\n]+$/g) ?? []
}

/** The words of a heading block such as `## How it works`, or null for any other block and for a heading without words. */
function headingOf(block: string): string | null {
  const end = block.indexOf('\n')
  const line = end < 0 ? block : block.slice(0, end)
  const opening = /^ {0,3}#{1,6}[ \t]/.exec(line)
  if (opening === null) return null
  return withoutClosingMarks(line.slice(opening[0].length).trim()) || null
}

/** Takes off the `#` that may close a heading behind a blank. By hand: a pattern would try every run of blanks anew. */
function withoutClosingMarks(words: string): string {
  let end = words.length
  while (words[end - 1] === '#') end -= 1
  const closed = end === 0 || words[end - 1] === ' ' || words[end - 1] === '\t'
  return closed ? words.slice(0, end).trimEnd() : words
}
