export { firstSentence }

/** The first of the two sentences of a purpose: what the calculator answers. */
function firstSentence(purpose: string): string {
  return /^.*?[.?!](?=\s|$)/s.exec(purpose)?.[0] ?? purpose
}
