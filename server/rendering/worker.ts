import { parentPort } from 'node:worker_threads'
import { isAppError } from '../errors.ts'
import type { RefusalCode } from './errors.ts'
import { createBodyRenderer } from './render-body.ts'
import type { WorkerAnswer, WorkerJob } from './worker-messages.ts'

// The thread that guide bodies are rendered in: a hostile text can at worst stop this thread, which is then
// replaced.

const renderBody = createBodyRenderer()
// The first rendering pays for much that later ones find ready; no member's text should have to.
renderBody(
  '## Ready\n\n| a | b |\n|---|---|\n| `c` | *d* |\n\n:::caution{kind=eyes}\nWear glasses.\n:::\n\n::formula[\\frac{1}{2}]',
  { calculators: [], glossary: {}, adjustables: [] },
)

parentPort!.on('message', (job: WorkerJob) => say(answer(job)))
say({ kind: 'ready' })

function answer({ markdown, vocabulary }: WorkerJob): WorkerAnswer {
  try {
    return { kind: 'rendered', result: renderBody(markdown, vocabulary) }
  } catch (error) {
    if (isAppError(error)) return { kind: 'refused', code: error.code as RefusalCode, message: error.message }
    return { kind: 'failed', message: error instanceof Error ? (error.stack ?? error.message) : String(error) }
  }
}

function say(message: WorkerAnswer): void {
  parentPort!.postMessage(message)
}
