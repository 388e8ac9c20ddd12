import { expect, it } from 'vitest'
import { headingsOf } from './headings.ts'

it('reads level, fragment and words out of stored HTML', () => {
  expect(
    headingsOf('<h2 id="how-it-works">How <em>it</em> works</h2><p>x</p><h3 class="a" id="a-b">A &amp; B &lt;c&gt;</h3><h4>none</h4>'),
  ).toEqual([
    { level: 2, id: 'how-it-works', text: 'How it works' },
    { level: 3, id: 'a-b', text: 'A & B <c>' },
  ])
})
