import { execFile } from 'node:child_process'
import { once } from 'node:events'
import { promisify } from 'node:util'
import type { Worker } from 'node:worker_threads'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { pathologicalInputs } from './fixtures/pathological.ts'
import { vocabulary } from './fixtures/vocabulary.ts'
import { createGuideRenderer } from './guide-renderer.ts'
import type { GuideRenderer, GuideRendererOptions } from './guide-renderer.ts'
import type { RenderVocabulary } from './types.ts'
import { RENDERER_VERSION } from './version.ts'

// Threads take a second or two to start, longer on a busy machine.
vi.setConfig({ testTimeout: 180_000 })

let renderer: GuideRenderer
let threads: Worker[] = []
const remember = (thread: Worker) => threads.push(thread)

function start(options: Partial<GuideRendererOptions> = {}): GuideRenderer {
  renderer = createGuideRenderer({ vocabulary, timeoutMs: 60_000, ...options })
  return renderer
}

beforeEach(() => {
  threads = []
  process.on('worker', remember)
})
afterEach(async () => {
  process.off('worker', remember)
  await renderer.close()
})

const slowText = pathologicalInputs.autolinks!

test('one thread renders text after text, with the vocabulary of the moment, whatever was wrong with the one before', async () => {
  let current: () => Promise<RenderVocabulary> = () => Promise.resolve(vocabulary)
  const { render } = start({ vocabulary: () => current() })

  expect(await render(':term[droop]')).toMatchObject({ problems: [], plainText: 'droop', rendererVersion: RENDERER_VERSION })
  current = () => Promise.resolve({ ...vocabulary, glossary: {} })
  expect((await render(':term[droop]')).problems).toMatchObject([{ code: 'unknown_term' }])

  await expect(render('> '.repeat(50))).rejects.toMatchObject({ isAppError: true, code: 'too_deep', status: 422 })
  current = () => Promise.reject(new Error('no database'))
  await expect(render('a')).rejects.toThrow('no database')
  current = () => Promise.resolve(vocabulary)
  expect((await render('a')).html).toBe('<p>a</p>\n')
  expect(threads).toHaveLength(1)
})

test('a text that takes too long is stopped, and the next one is rendered by a new thread', async () => {
  const { render } = start({ timeoutMs: 150 })
  await expect(render(slowText)).rejects.toMatchObject({ code: 'timed_out', status: 422 })
  expect((await render('a')).html).toBe('<p>a</p>\n')
  expect(threads).toHaveLength(2)
})

test('texts wait their turn up to a limit, then they are turned away; a thread is replaced after its share', async () => {
  const { render } = start({ maxWaiting: 2, rendersPerThread: 2 })
  const [first, second, third, fourth] = ['a', 'b', 'c', 'd'].map((text) => render(text))
  await expect(fourth).rejects.toMatchObject({ code: 'busy', status: 503 })
  const results = await Promise.all([first!, second!, third!])
  expect(results.map((result) => result.plainText)).toEqual(['a', 'b', 'c'])
  expect(threads).toHaveLength(2)
})

test('one member has two texts in hand at most, and others are served meanwhile', async () => {
  const { render } = start()
  const own = ['a', 'b'].map((text) => render(text, { owner: 'priya' }))
  await expect(render('c', { owner: 'priya' })).rejects.toMatchObject({ code: 'busy', status: 503, message: expect.stringContaining('Your last preview') })
  expect((await render('d', { owner: 'tomasz' })).plainText).toBe('d')
  await Promise.all(own)
  expect((await render('e', { owner: 'priya' })).plainText).toBe('e')
})

test('a refused text counts no longer against its owner', async () => {
  const { render } = start()
  for (let n = 0; n < 3; n++) await expect(render('> '.repeat(50), { owner: 'priya' })).rejects.toMatchObject({ code: 'too_deep' })
  expect((await render('a', { owner: 'priya' })).plainText).toBe('a')
})

test('what is urgent goes before previews, in its own order, and finds room when they fill the queue', async () => {
  const { render } = start({ maxWaiting: 2 })
  const done: string[] = []
  const follow = (text: string, urgent: boolean) => render(text, { urgent }).then(() => done.push(text))
  const all = [follow('under way', false), follow('preview 1', false), follow('preview 2', false), follow('sent 1', true), follow('sent 2', true)]
  await expect(render('preview 3')).rejects.toMatchObject({ code: 'busy' })
  await Promise.all(all)
  expect(done).toEqual(['under way', 'sent 1', 'sent 2', 'preview 1', 'preview 2'])
})

test('a thread that dies takes only its own text with it, and is not missed when idle', async () => {
  const { render } = start()
  await render('a')
  const lost = render(slowText)
  const kept = render('b')
  void threads[0]!.terminate()
  await expect(lost).rejects.toThrow(/stopped/)
  expect((await kept).plainText).toBe('b')

  void threads[1]!.terminate()
  await once(threads[1]!, 'exit')
  expect((await render('c')).plainText).toBe('c')
})

test('two threads work side by side', async () => {
  const { render } = start({ threads: 2 })
  await Promise.all(['a', 'b', 'c'].map((text) => render(text)))
  expect(threads).toHaveLength(2)
})

test('closing rejects what is under way and what waits', async () => {
  const { render, close } = start()
  const both = Promise.allSettled([render('a'), render('b')])
  await close()
  expect((await both).map((outcome) => outcome.status)).toEqual(['rejected', 'rejected'])
  await expect(render('c')).rejects.toThrow('closed')
})

test('runs in a plain process with TypeScript, and being idle lets that process end', async () => {
  const script = `
    import { createGuideRenderer } from ${JSON.stringify(new URL('./guide-renderer.ts', import.meta.url).href)}
    const { render } = createGuideRenderer({ vocabulary: ${JSON.stringify(vocabulary)} })
    console.log((await render('*a*')).html)`
  const { stdout } = await promisify(execFile)(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script])
  expect(stdout).toBe('<p><em>a</em></p>\n\n')
})
