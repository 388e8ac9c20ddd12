export { splitBlocks, headingOf }

/**
 * Splits Markdown into paragraphs, each with the blank lines after it, so that the blocks joined give the text again.
 * Blank lines before the first paragraph are a block of their own.
 */
function splitBlocks(text: string): string[] {
  const blocks: string[] = []
  let block = ''
  let ended = false
  for (const line of text.match(/[^\n]*\n|[^\n]+$/g) ?? []) {
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

/** The words of a heading block such as `## How it works`, or null for any other block. */
function headingOf(block: string): string | null {
  const match = /^ {0,3}#{1,6}[ \t]+([^\n]+)/.exec(block)
  return match?.[1]?.replace(/[ \t]+#*[ \t]*$/, '').trim() ?? null
}
