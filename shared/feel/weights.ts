export { feelWeights, sureThresholds }

import type { Basis } from '#shared/vocabulary/effect-words.ts'

/** Every number that by feel's ranking rests on, in one place so that it can be argued with. */
const feelWeights = {
  /**
   * How much one point of harm elsewhere counts against one point of help. A driver in trouble takes some harm
   * for a cure, but of two cures the harmless one wins.
   */
  cost: 0.35,
  /** An effect that names the reader's own ground or class. */
  namedFit: 1,
  /** One that is silent about it: most likely true there too, but nobody said so. */
  silentFit: 0.8,
  /** How many reports the prior is worth: with ten reports, members and guide count alike. */
  priorReports: 10,
  /** How far an effect is trusted before anybody has reported on it. */
  prior: { physics: 0.7, common_practice: 0.6, reported: 0.4 } satisfies Record<Basis, number>,
  /** Two-sided 95 % of the normal distribution, for the Wilson score interval. */
  z: 1.96,
} as const

/** From how many reports, and which share of them agreeing, a change is called settled or leaning. */
const sureThresholds = {
  settled: { reports: 10, share: 0.8 },
  leaning: { reports: 5, share: 0.6 },
} as const
