export { wilsonLowerBound }

/**
 * The lower bound of the Wilson score interval for a share of `successes` in `n`, between 0 and 1. Successes
 * may be halves: a report of no difference counts as one. Without a success it is 0, with or without reports.
 *
 * Source: E. B. Wilson, “Probable inference, the law of succession, and statistical inference”, Journal of the
 * American Statistical Association 22 (1927) 209.
 */
function wilsonLowerBound(successes: number, n: number, z: number): number {
  if (successes === 0) return 0
  const share = successes / n
  const middle = share + z ** 2 / (2 * n)
  const spread = z * Math.sqrt((share * (1 - share)) / n + z ** 2 / (4 * n ** 2))
  return (middle - spread) / (1 + z ** 2 / n)
}
