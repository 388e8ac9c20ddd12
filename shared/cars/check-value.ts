export { checkCarValue }

import { figure, say, type Sentence } from '#shared/calculators/sentence.ts'
import type { CarValue } from './car-values.ts'

/** What is wrong with one value by itself; undefined when nothing is. */
function checkCarValue(entry: CarValue, value: unknown): Sentence | undefined {
  const range = say`between ${figure(entry.min, entry.unit, 9)} and ${figure(entry.max, entry.unit, 9)}`
  if (typeof value !== 'number' || !Number.isFinite(value)) return [`${entry.label} must be a number, `, ...range, '.']
  if (value < entry.min || value > entry.max) return [`${entry.label} must be `, ...range, '.']
  if (entry.whole && !Number.isInteger(value)) return say`${entry.label} must be a whole number.`
  return undefined
}
