import { describe, expect, it } from 'vitest'
import { runWorkedExamples } from '#shared/guides/worked-examples.ts'
import { calculator as fluidBlend } from '#shared/calculators/fluid-blend/index.ts'
import { exampleSentence, exampleWords } from './example-words.ts'

const inputs = { lowViscosity: 5000, highViscosity: 10000, targetViscosity: 7000, totalVolume: 10 }

function words(value: number, tolerance: number, changed: Partial<typeof inputs> = {}) {
  const part = { n: 1, kind: 'worked' as const, slug: 'fluid-blend', inputs: { ...inputs, ...changed }, expect: { key: 'highVolume', value }, tolerance }
  const [example] = runWorkedExamples({ calculators: new Map([['fluid-blend', fluidBlend]]) }, [part])
  return exampleWords(example!, fluidBlend)
}

describe('exampleWords', () => {
  // 10 mL × ln(7000/5000) / ln(10000/5000) = 4.85427 mL, by hand from the rule of Arrhenius that the calculator cites.
  it('says that an example matches, and prints as many digits as its writer gave', () => {
    const example = words(4.854, 0.001)
    expect(example).toMatchObject({ matches: true, says: '4.854\u00A0mL', gives: '4.854\u00A0mL', allowed: '0.1\u00A0%', problem: null })
    expect(example.given[0]).toBe('thinner fluid 5,000\u00A0cSt')
    expect(example.asked).toBe('Thicker fluid')
  })

  it('says that it does not match, with both numbers', () => {
    expect(words(5, 0.01)).toMatchObject({ matches: false, says: '5\u00A0mL', gives: '4.85\u00A0mL' })
  })

  it('says why there is no answer instead of failing the page', () => {
    const example = words(5, 0.01, { targetViscosity: 20000 })
    expect(example).toMatchObject({ matches: false, gives: null })
    expect(example.problem).toContain('cannot be reached')
  })

  it('links to the calculator with every number', () => {
    expect(words(4.854, 0.001).href).toBe(
      '/calculators/fluid-blend?fluid-blend.lowViscosity=5000&fluid-blend.highViscosity=10000&fluid-blend.targetViscosity=7000&fluid-blend.totalVolume=10#fluid-blend',
    )
  })

  it('tells both numbers in one line, and how far off it may be only when it does not match', () => {
    expect(exampleSentence(words(4.854, 0.001))).toMatch(/thicker fluid: the page says 4\.854\u00A0mL; the formula gives 4\.854\u00A0mL\.$/)
    expect(exampleSentence(words(5, 0.01))).toContain('Allowed: 1\u00A0% off.')
    expect(exampleSentence(words(5, 0.01, { targetViscosity: 20000 }))).toContain('there is no answer.')
  })
})
