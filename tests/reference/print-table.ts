// Prints every reference check as a table: `npm run check:reference`. Ends with 1 when a value is out of
// tolerance.

import { loadCalculators } from '#server/calculators/load-registry.ts'
import { loadReferenceCases } from './all-cases.ts'
import { withinTolerance } from './reference-case.ts'

const calculators = await loadCalculators()
const cases = await loadReferenceCases(calculators.keys())
const short = (value: number) => String(Number(value.toPrecision(10)))

let missed = 0
for (const slug of calculators.keys()) {
  process.stdout.write(`\n${slug}\n`)
  for (const reference of cases.filter(({ calculator }) => calculator === slug)) {
    const got = reference.got()
    const holds = withinTolerance(reference, got)
    if (!holds) missed += 1
    process.stdout.write(
      [
        `  ${holds ? 'ok  ' : 'MISS'} ${reference.what}`,
        `       expected ${short(reference.expected)}  got ${short(got)}  difference ${(got - reference.expected).toExponential(2)}` +
          `  allowed ${reference.tolerance.toExponential(1)}  [${reference.unit}]: ${reference.toleranceReason}`,
        `       ${reference.evidence}: ${reference.source}`,
        '',
      ].join('\n'),
    )
  }
}
process.stdout.write(`\n${cases.length} values from outside, ${missed} out of tolerance\n`)
process.exitCode = missed === 0 ? 0 : 1
