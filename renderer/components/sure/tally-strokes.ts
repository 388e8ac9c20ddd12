export { tallyStrokes }

/**
 * Chalk strokes in fives, the fifth across the other four; then short ones for who does not agree. Drawn in a box 21
 * high and `width` wide.
 */
function tallyStrokes(agree: number, others: number): { agree: string; others: string; width: number } {
  let x = 2
  let full = ''
  for (let at = 0; at < agree; at++) {
    if (at % 5 < 4) {
      full += `M${x} 3.5L${x + 0.8} 18`
      x += 5
    } else {
      full += `M${x - 22} 15L${x - 1} 6`
      x += 4
    }
  }
  if (others > 0) x += 5
  let short = ''
  for (let at = 0; at < others; at++) {
    short += `M${x} 11V18`
    x += 5
  }
  return { agree: full, others: short, width: x }
}
