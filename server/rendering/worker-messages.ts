export type { WorkerAnswer, WorkerJob }

import type { RefusalCode } from './errors.ts'
import type { RenderResult, RenderVocabulary } from './types.ts'

/** What a worker is asked. The vocabulary comes along because it may have changed since the text before. */
interface WorkerJob {
  markdown: string
  vocabulary: RenderVocabulary
}

/** What a worker says: once that it is ready, then one answer to each job. */
type WorkerAnswer =
  | { kind: 'ready' }
  | { kind: 'rendered'; result: RenderResult }
  | { kind: 'refused'; code: RefusalCode; message: string }
  | { kind: 'failed'; message: string }
