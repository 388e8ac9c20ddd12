import { expect, it } from 'vitest'
import { splitLinks } from './split-links.ts'

const origin = 'http://localhost:3000'

it('makes links of this site clickable by their path, and of no other', () => {
  const text = `Set it here:\n\n${origin}/reset?token=ab_C-1\n\nor http://else.example/x, or javascript:alert(1)`
  expect(splitLinks(text, origin)).toEqual([
    { text: 'Set it here:\n\n' },
    { text: `${origin}/reset?token=ab_C-1`, href: '/reset?token=ab_C-1' },
    { text: '\n\nor ' },
    { text: 'http://else.example/x,' },
    { text: ' or javascript:alert(1)' },
  ])
})

it('loses no character', () => {
  const text = `${origin}${origin}/ <${origin}/a>"${origin}/b" http:// https://[`
  expect(splitLinks(text, origin).map((part) => part.text).join('')).toBe(text)
})
