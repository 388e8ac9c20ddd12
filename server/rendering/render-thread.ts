export { RenderThread }

import { Worker } from 'node:worker_threads'
import { RenderRefusedError } from './errors.ts'
import type { RenderResult } from './types.ts'
import type { WorkerAnswer, WorkerJob } from './worker-messages.ts'

/**
 * Enough for any text within the limits; a worker that needs more is stopped by Node.js, and with it the
 * text.
 */
const MAX_HEAP_MIB = 256
const START_TIMEOUT_MS = 60_000

const TOO_HEAVY =
  'This text takes more memory to lay out than a guide may use. Take out nesting, tables or links, or split it.'
const TIMED_OUT =
  'This text takes too long to lay out. Take out nesting, tables or repeated marks, or split it in two.'

/**
 * One worker thread: started once, asked one text at a time, stopped for good when it dies or a text takes
 * too long.
 */
class RenderThread {
  /** Settles when the thread can take a text; rejects when it could not start. */
  readonly ready: Promise<void>
  /** Texts answered so far. */
  renders = 0
  private readonly worker: Worker
  private dead: Error | null = null
  private onAnswer: ((answer: WorkerAnswer) => void) | null = null
  private onDeath: ((reason: Error) => void) | null = null

  constructor() {
    this.worker = new Worker(new URL('./worker-start.mjs', import.meta.url), {
      // Whatever loaders the process was started with, the thread brings its own.
      execArgv: [],
      resourceLimits: { maxOldGenerationSizeMb: MAX_HEAP_MIB },
    })
    this.worker.on('message', (answer: WorkerAnswer) => this.onAnswer?.(answer))
    this.worker.on('error', (error) => this.die(error))
    this.worker.on('exit', (code) => this.die(new Error(`The rendering thread stopped with code ${code}.`)))
    const started = this.next(START_TIMEOUT_MS, () => new Error('The rendering thread did not start in time.'))
    this.ready = started.then(() => undefined)
    // Whoever waits for it is told; a thread nobody waits for may fail in silence and is replaced when needed.
    this.ready.catch(() => undefined)
  }

  get alive(): boolean {
    return this.dead === null
  }

  /**
   * Renders one text; call it again only after it has settled.
   *
   * @throws RenderRefusedError for a text beyond the limits, too slow or too heavy (the thread is dead after
   *   the last two)
   */
  async render(job: WorkerJob, timeoutMs: number): Promise<RenderResult> {
    this.worker.postMessage(job)
    const answer = await this.next(timeoutMs, () => new RenderRefusedError('timed_out', TIMED_OUT))
    this.renders += 1
    switch (answer.kind) {
      case 'rendered':
        return answer.result
      case 'refused':
        throw new RenderRefusedError(answer.code, answer.message)
      default:
        throw new Error(`Rendering failed: ${answer.kind === 'failed' ? answer.message : answer.kind}`)
    }
  }

  /** Whether the process waits for this thread; an idle one must not keep a command from ending. */
  keepProcessAlive(yes: boolean): void {
    if (yes) this.worker.ref()
    else this.worker.unref()
  }

  async stop(): Promise<void> {
    this.die(new Error('The renderer is closed.'))
    await this.worker.terminate()
  }

  private next(timeoutMs: number, timeoutError: () => Error): Promise<WorkerAnswer> {
    return new Promise<WorkerAnswer>((resolve, reject) => {
      if (this.dead !== null) return reject(this.dead)
      const timer = setTimeout(() => {
        this.die(timeoutError())
        void this.worker.terminate()
      }, timeoutMs)
      const settle = () => {
        clearTimeout(timer)
        this.onAnswer = this.onDeath = null
      }
      this.onAnswer = (answer) => {
        settle()
        resolve(answer)
      }
      this.onDeath = (reason) => {
        settle()
        reject(reason)
      }
    })
  }

  private die(reason: Error): void {
    if (this.dead !== null) return
    const outOfMemory = (reason as NodeJS.ErrnoException).code === 'ERR_WORKER_OUT_OF_MEMORY'
    this.dead = outOfMemory ? new RenderRefusedError('too_heavy', TOO_HEAVY) : reason
    this.onDeath?.(this.dead)
  }
}
