import { expect, test } from 'vitest'
import { isAppError } from '../errors.ts'
import { pathologicalInputs } from './fixtures/pathological.ts'
import { vocabulary } from './fixtures/vocabulary.ts'
import { measureMarkup } from './gates.ts'
import { createBodyRenderer } from './render-body.ts'

const render = createBodyRenderer()

/** How a text fares: `rendered`, or the code of the refusal. Anything else that is thrown goes on. */
function fate(markdown: string): string {
  try {
    render(markdown, vocabulary)
    return 'rendered'
  } catch (error) {
    if (!isAppError(error)) throw error
    expect(error).toMatchObject({ name: 'RenderRefusedError', status: 422, fields: [{ field: 'body', message: error.message }] })
    return error.code
  }
}

test.each([
  ['64 KiB', 'ä'.repeat(32 * 1024), 'rendered'],
  ['one byte more', `${'ä'.repeat(32 * 1024)}a`, 'too_long'],
  ['quotes 32 deep', `${'> '.repeat(31)}a`, 'rendered'],
  ['quotes 33 deep', `${'> '.repeat(33)}a`, 'too_deep'],
  ['emphasis too deep', '*a **a '.repeat(20) + 'b' + ' a** a*'.repeat(20), 'too_deep'],
  ['marks too deep', `${':basis['.repeat(40)}x${']{kind=physics}'.repeat(40)}`, 'too_deep'],
  ['nested emphasis that takes a sanitiser seconds', '*a **a '.repeat(1000) + 'b' + ' a** a*'.repeat(1000), 'too_deep'],
  ['too many list items', '- a\n'.repeat(10_000), 'too_many_tokens'],
  ['too many elements from few tokens', `::formula[${'x'.repeat(900)}]\n`.repeat(15), 'too_many_tokens'],
  ['a short text that writes out long', `[a]: https://example.org/${'x'.repeat(2_000)}\n\n${'[a] '.repeat(4_000)}`, 'too_long'],
])('%s: %#', (_what, markdown, expected) => {
  expect(fate(markdown)).toBe(expected)
})

test.each(Object.entries(pathologicalInputs))('ends in good time: %s', { timeout: 60_000 }, (_what, markdown) => {
  // Processor time, because the clock also counts what else the machine is doing. Without the gates several of these
  // texts take more than ten seconds.
  const before = process.cpuUsage()
  expect(['rendered', 'too_long', 'too_deep', 'too_many_tokens']).toContain(fate(markdown))
  const { user, system } = process.cpuUsage(before)
  expect((user + system) / 1000).toBeLessThan(4_000)
})

test('a refusal says where', () => {
  expect(() => render(`a\n\nb\n\n${'> '.repeat(40)}c`, vocabulary)).toThrow(/near line 5/)
})

test('measures elements and depth', () => {
  expect(measureMarkup('a &lt;b&gt;')).toEqual({ elements: 0, depth: 0 })
  expect(measureMarkup('<p>a<br><em>b<b>c</b></em></p><hr><p></p>')).toEqual({ elements: 6, depth: 3 })
})
