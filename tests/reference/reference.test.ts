import { describe, expect, it } from 'vitest'
import { loadCalculators } from '#server/calculators/load-registry.ts'
import { loadReferenceCases } from './all-cases.ts'

const calculators = await loadCalculators()
const cases = await loadReferenceCases(calculators.keys())

describe('values from outside the project', () => {
  it.each([...calculators.keys()])('%s is held against at least two of them', (slug) => {
    expect(cases.filter(({ calculator }) => calculator === slug).length).toBeGreaterThanOrEqual(2)
  })

  it.each(cases)('$calculator: $what ($evidence)', ({ got, expected, tolerance }) => {
    expect(Math.abs(got() - expected)).toBeLessThanOrEqual(tolerance)
  })

  it('name their source and say why they allow the difference they allow', () => {
    for (const { source, toleranceReason, tolerance, expected } of cases) {
      expect(source.length).toBeGreaterThan(20)
      expect(toleranceReason.length).toBeGreaterThan(15)
      expect(tolerance).toBeGreaterThan(0)
      expect(tolerance).toBeLessThanOrEqual(0.05 * Math.abs(expected))
    }
  })
})
