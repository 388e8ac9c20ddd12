export { holdsBack }

/** Something that the writer asked for would be missing from the page, or a caution would come without its kind. */
const HOLDING = new Set([
  'unknown_calculator', 'unknown_end', 'unknown_input', 'unknown_output', 'unknown_adjustable', 'unknown_kind', 'missing_attribute', 'not_a_number',
  'out_of_range', 'bad_tolerance', 'part_inside', 'too_many_parts',
])

/**
 * Whether a problem keeps a guide from being sent and printed. The others are remarks: the text is printed as it was written,
 * and writer and moderator see what was noticed.
 */
function holdsBack(problem: { code: string }): boolean {
  return HOLDING.has(problem.code)
}
