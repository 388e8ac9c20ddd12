import { expect, test } from 'vitest'
import { partPlaceholder, splitParts } from './split-parts.ts'
import type { RenderedPart } from './parts.ts'

const calculator: RenderedPart = { n: 1, kind: 'calculator', slug: 'fluid-temperature', preset: {} }
const effects: RenderedPart = { n: 2, kind: 'effects', adjustable: 'front_diff_fluid' }

test('gives HTML and parts in reading order', () => {
  const html = `<p>a</p>\n${partPlaceholder(calculator)}\n<p>b</p>${partPlaceholder(effects)}`
  expect(splitParts(html, [calculator, effects])).toEqual([
    { kind: 'html', html: '<p>a</p>\n' },
    calculator,
    { kind: 'html', html: '\n<p>b</p>' },
    effects,
  ])
})

test('leaves out a placeholder that has no part, or one of another kind', () => {
  const html = `<p>a</p>${partPlaceholder({ kind: 'worked', n: 9 })}${partPlaceholder({ kind: 'worked', n: 1 })}<p>b</p>`
  expect(splitParts(html, [calculator])).toEqual([{ kind: 'html', html: '<p>a</p>' }, { kind: 'html', html: '<p>b</p>' }])
})

test('words that look like a placeholder stay words', () => {
  const escaped = '<p>&lt;div data-part="calculator" data-n="1"&gt;&lt;/div&gt;</p>'
  expect(splitParts(escaped, [calculator])).toEqual([{ kind: 'html', html: escaped }])
  expect(splitParts('', [])).toEqual([])
})
