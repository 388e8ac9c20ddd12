import { expect, test } from 'vitest'
import { parseAttributes } from './attributes.ts'

test.each<{ written: string; read: Record<string, string> }>([
  { written: '', read: {} },
  { written: 'kind=lithium', read: { kind: 'lithium' } },
  { written: '  a=1   b=-2.5e3  ', read: { a: '1', b: '-2.5e3' } },
  { written: 'expect=highVolume:4.854 tolerance=1%', read: { expect: 'highVolume:4.854', tolerance: '1%' } },
  { written: 'a="two words" b=\'three "quoted" words\'', read: { a: 'two words', b: 'three "quoted" words' } },
  { written: 'a="" b=x', read: { a: '', b: 'x' } },
  { written: 'constructor=1 toString=2', read: { ['constructor']: '1', ['toString']: '2' } },
])('reads {$written}', ({ written, read }) => {
  expect(parseAttributes(written)).toEqual({ attributes: new Map(Object.entries(read)), faults: [] })
})

test.each([
  { written: '#id', says: '“#id” is not understood' },
  { written: '.class', says: '“.class” is not understood' },
  { written: 'open', says: '“open” is not understood' },
  { written: '=x', says: '“=x” is not understood' },
  { written: '__proto__=x', says: '“__proto__=x” is not understood' },
  { written: 'a=', says: '“a=” has no readable value' },
  { written: 'a= b', says: '“a=” has no readable value' },
  { written: 'a="b', says: '“a="b” has no readable value' },
  { written: 'a="b"c', says: '“a="b"c” has no readable value' },
  { written: 'a=<b>', says: '“a=<b>” has no readable value' },
  { written: 'a=b"c', says: '“a=b"c” has no readable value' },
])('tells the writer about {$written} and reads the rest', ({ written, says }) => {
  const { attributes, faults } = parseAttributes(`x=1 ${written}`)
  expect(faults[0]).toContain(says)
  expect(attributes.get('x')).toBe('1')
})

test('a key given twice keeps its first value', () => {
  const { attributes, faults } = parseAttributes('a=1 a=2')
  expect(attributes).toEqual(new Map([['a', '1']]))
  expect(faults).toEqual(['“a” is given twice; the first one counts.'])
})
