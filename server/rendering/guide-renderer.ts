export { createGuideRenderer }
export type { GuideRenderer, GuideRendererOptions, RenderOrder }

import { RenderRefusedError } from './errors.ts'
import { RenderThread } from './render-thread.ts'
import type { RenderResult, RenderVocabulary } from './types.ts'

interface GuideRendererOptions {
  /**
   * What the texts may refer to; a function is asked anew for each text, so that a new glossary entry counts
   * at once.
   */
  vocabulary: RenderVocabulary | (() => RenderVocabulary | Promise<RenderVocabulary>)
  /**
   * Longest time one text may take, in milliseconds, not counting the wait for a free thread. @default 2000
   */
  timeoutMs?: number
  /** @default 1 */
  threads?: number
  /** Texts that may wait before others are turned away, urgent and other ones each. @default 50 */
  maxWaiting?: number
  /** Texts of one owner that may wait or be under way. @default 2 */
  maxOfOneOwner?: number
  /** Texts after which a thread is replaced: a DOM that lives long grows. @default 200 */
  rendersPerThread?: number
}

/** Whose text it is and how soon it is needed, so that nobody's previews keep others waiting. */
interface RenderOrder {
  /** The member it is laid out for. Without one it is not counted. */
  owner?: string
  /** Before all that is not: something is sent or published with it. */
  urgent?: boolean
}

interface GuideRenderer {
  /**
   * A guide's Markdown body as safe HTML with its parts, headings and problems.
   *
   * @throws RenderRefusedError too_long, too_deep, too_many_tokens, too_heavy, timed_out: the text must
   *   change;
   *   busy: try again later, when fewer texts wait or the owner's own are done
   */
  render(markdown: string, order?: RenderOrder): Promise<RenderResult>
  /** Stops the threads; what still waits is rejected. */
  close(): Promise<void>
}

interface Waiting extends RenderOrder {
  markdown: string
  resolve(result: RenderResult): void
  reject(error: unknown): void
}

/**
 * Starts the renderer: a few worker threads that can be stopped, because no text of a member's may hold up
 * the server. The first thread starts at once, so that the first text does not wait for a DOM to load.
 */
function createGuideRenderer(options: GuideRendererOptions): GuideRenderer {
  const { vocabulary, timeoutMs = 2_000, threads = 1, maxWaiting = 50, maxOfOneOwner = 2, rendersPerThread = 200 } = options
  const waiting: Waiting[] = []
  const idle: RenderThread[] = [startThread()]
  const all = new Set(idle)
  const underWay = new Set<Waiting>()
  let closed = false

  function startThread(): RenderThread {
    const thread = new RenderThread()
    thread.keepProcessAlive(false)
    return thread
  }

  function takeThread(): RenderThread | undefined {
    const thread = idle.pop()
    if (thread?.alive) return thread
    if (thread !== undefined) all.delete(thread)
    if (all.size >= threads) return undefined
    const fresh = startThread()
    all.add(fresh)
    return fresh
  }

  function giveBack(thread: RenderThread): void {
    thread.keepProcessAlive(false)
    if (closed) return
    if (thread.alive && thread.renders < rendersPerThread) {
      idle.push(thread)
      return
    }
    all.delete(thread)
    void thread.stop()
    // The next text should find a thread that has started already.
    const fresh = startThread()
    all.add(fresh)
    idle.push(fresh)
  }

  async function serve(job: Waiting, thread: RenderThread): Promise<void> {
    thread.keepProcessAlive(true)
    underWay.add(job)
    try {
      const current = typeof vocabulary === 'function' ? await vocabulary() : vocabulary
      await thread.ready
      job.resolve(await thread.render({ markdown: job.markdown, vocabulary: current }, timeoutMs))
    } catch (error) {
      job.reject(error)
    } finally {
      underWay.delete(job)
      giveBack(thread)
      serveNext()
    }
  }

  function serveNext(): void {
    while (waiting.length > 0 && !closed) {
      const thread = takeThread()
      if (thread === undefined) return
      void serve(waiting.shift()!, thread)
    }
  }

  /** Why a text has to come back later, or null. */
  function busyWith({ owner, urgent = false }: RenderOrder): string | null {
    const own = owner === undefined ? 0 : [...waiting, ...underWay].filter((job) => job.owner === owner).length
    if (own >= maxOfOneOwner) return 'Your last preview is still being made. Your text is unchanged: try again in a few seconds.'
    const alike = waiting.filter((job) => (job.urgent ?? false) === urgent).length
    return alike < maxWaiting ? null : 'Many texts are being laid out just now. Yours is unchanged: try again in a few seconds.'
  }

  function queue(job: Waiting): void {
    const firstOther = job.urgent === true ? waiting.findIndex((other) => other.urgent !== true) : -1
    waiting.splice(firstOther < 0 ? waiting.length : firstOther, 0, job)
  }

  return {
    render(markdown, order = {}) {
      return new Promise((resolve, reject) => {
        if (closed) return reject(new Error('The renderer is closed.'))
        const busy = busyWith(order)
        if (busy !== null) return reject(new RenderRefusedError('busy', busy))
        queue({ ...order, markdown, resolve, reject })
        serveNext()
      })
    },
    async close() {
      closed = true
      for (const job of waiting.splice(0)) job.reject(new Error('The renderer is closed.'))
      await Promise.all([...all].map((thread) => thread.stop()))
    },
  }
}
