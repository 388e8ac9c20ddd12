import { describe, expect, it } from 'vitest'
import { fenced, fn, frac, math, mathmlString, mathText, num, power, row, sub } from './mathml.ts'

describe('MathML', () => {
  it('tells numbers, operators and names apart', () => {
    expect(mathmlString(math('x', '=', 2))).toBe(
      '<math displaystyle="true"><mrow><mi>x</mi><mo>=</mo><mn>2</mn></mrow></math>',
    )
  })

  it('builds fractions, powers, indices and functions', () => {
    expect(mathmlString(frac('a', power('b', 2)))).toBe(
      '<mfrac><mi>a</mi><msup><mi>b</mi><mn displaystyle="true">2</mn></msup></mfrac>',
    )
    expect(mathmlString(sub('ν', 'thin'))).toBe('<msub><mi>ν</mi><mtext>thin</mtext></msub>')
    expect(mathText(math('x', '=', frac(fn('ln', fenced('a')), row('b', '+', 1))))).toBe(
      'x = (ln (a))/(b + 1)',
    )
  })

  it('fences a negative number and groups thousands', () => {
    expect(mathText(row(3, '×', num(-7000)))).toBe('3 × ( − 7,000)')
  })

  it('escapes what HTML would read as markup', () => {
    expect(mathmlString(row('<b>&'))).toBe('<mrow><mi>&lt;b&gt;&amp;</mi></mrow>')
  })
})
