export { uncapital }

/** A phrase for the middle of a sentence: its first letter small, everything else (4WD, 1/8) as it was. */
function uncapital(text: string): string {
  return text.slice(0, 1).toLowerCase() + text.slice(1)
}
