export { VERDICTS, verdicts }
export type { Verdict }

/** What a change did for who tried it. */
const VERDICTS = ['helped', 'same', 'worse'] as const
type Verdict = (typeof VERDICTS)[number]

const verdicts: Record<Verdict, string> = { helped: 'Helped', same: 'No difference', worse: 'Worse' }
