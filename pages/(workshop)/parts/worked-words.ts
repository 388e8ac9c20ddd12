export { workedWords }

import type { WorkedExample } from '#server/edits/worked-examples.ts'
import { formatNumber } from '#shared/units/format-number.ts'

/** A worked example that was run again: the verdict in a word or two, and both numbers. */
function workedWords(example: WorkedExample): { verdict: string; words: string } {
  const { calculator, output, unit, says, gives, offBy, allowed } = example
  const show = (value: number) => `${formatNumber(value, 5)}${unit === '' || unit === '1' ? '' : `\u00A0${unit}`}`
  if (gives === null || offBy === null) {
    return { verdict: 'No answer', words: `${calculator}: there is no answer with these numbers. The page says ${show(says)}.` }
  }
  const words = `${calculator}, ${output.toLowerCase()}: the page says ${show(says)}; the formula gives ${show(gives)}.`
  if (example.matches) return { verdict: 'Matches', words }
  return { verdict: `Off by ${percent(offBy)}`, words: `${words} Allowed: ${percent(allowed)}.` }
}

function percent(share: number): string {
  const value = share * 100
  return `${value >= 10 ? formatNumber(Math.round(value), 9) : formatNumber(value, 2)}\u00A0%`
}
