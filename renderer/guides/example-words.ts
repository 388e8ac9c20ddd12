export { exampleSentence, exampleWords }
export type { ExampleWords }

import type { WorkedExample } from '#shared/guides/worked-examples.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { linkQuery } from '#shared/calculators/query.ts'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { formatNumber } from '#shared/units/format-number.ts'
import { joinUnit } from '#shared/units/units.ts'

/** A worked example as it came out just now, in words and figures ready to print. */
interface ExampleWords {
  /** Number of its part in the body. */
  n: number
  calculator: string
  verdict: 'Matches' | 'Does not match' | 'No answer'
  /** What was put in: “thinner fluid 5,000 cSt”. */
  given: string[]
  asked: string
  /** What its writer says, and what came out, to as many digits as the writer gave; null when there is no answer. */
  says: string
  gives: string | null
  matches: boolean
  /** How far off it may be: “1 %”. */
  allowed: string
  /** Why there is no answer. */
  problem: string | null
  /** The calculator with these numbers filled in. */
  href: string
}

/** Puts a worked example that was run again into words, in the calculator's own units; one whose calculator is gone has no answer. */
function exampleWords(example: WorkedExample, calculator: CalculatorDefinition | undefined): ExampleWords {
  const { inputs } = example
  const output = calculator?.outputs.find(({ label }) => label === example.output)
  const digits = Math.max(3, significantDigits(example.says))
  const print = (value: number) => (output === undefined ? formatNumber(value, digits) : joinUnit(formatNumber(value, digits), output.unit))
  const run = calculator === undefined ? null : runDefinition(calculator, inputs)
  return {
    n: example.n,
    calculator: example.calculator,
    verdict: example.gives === null ? 'No answer' : example.matches ? 'Matches' : 'Does not match',
    given: (calculator?.inputs ?? [])
      .filter(({ key }) => inputs[key] !== undefined)
      .map(({ key, label, unit }) => `${label.toLowerCase()} ${joinUnit(formatNumber(inputs[key]!, 9), unit)}`),
    asked: example.output,
    says: print(example.says),
    gives: example.gives === null ? null : print(example.gives),
    matches: example.matches,
    allowed: `${formatNumber(example.allowed * 100, 3)}\u00A0%`,
    problem: run === null ? 'The calculator is no longer in the book.' : run.ok ? null : run.errors.map(({ message }) => plainSentence(message)).join(' '),
    href: calculator === undefined ? '/calculators' : `/calculators/${calculator.slug}?${linkQuery(calculator, calculator.slug, run?.ok ? run.inputs : inputs)}#${calculator.slug}`,
  }
}

/** What the page says and what came out, in one line for a list. */
function exampleSentence({ calculator, asked, says, gives, matches, allowed, problem }: ExampleWords): string {
  const about = `${calculator}, ${asked.toLowerCase()}: the page says ${says}`
  if (gives === null) return `${about}; there is no answer. ${problem ?? ''}`.trimEnd()
  return `${about}; the formula gives ${gives}.${matches ? '' : ` Allowed: ${allowed} off.`}`
}

/** Digits that a number was written with, as far as they can be seen: 4.854 has four, 12004 has five. */
function significantDigits(value: number): number {
  const [mantissa = ''] = String(Math.abs(value)).split('e')
  return mantissa.replace('.', '').replace(/^0+/, '').length
}
