export { saveDraft, fetchCopy, fetchPreview }
export type { ClubCopy, PreviewAnswer }

import type { Preview } from '#server/edits/views.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { Problem } from '../../parts/problem-fields.ts'
import type { SaveAnswer, Snapshot } from './draft-keeper.ts'

/** A draft as the club holds it. */
interface ClubCopy extends Snapshot {
  version: number
  updatedAt: string
}

type PreviewAnswer =
  | { kind: 'ready'; preview: Preview }
  | { kind: 'refused'; message: string }
  | { kind: 'away'; retryAfterSeconds?: number }

interface ProblemDetails {
  title?: string
  errors?: Problem[]
}

/** Sends the words to the club, on top of the version they were written on. */
async function saveDraft(id: string, snapshot: Snapshot, version: number, { leaving }: { leaving: boolean }): Promise<SaveAnswer> {
  const response = await fetch(`/api/edits/${id}`, {
    method: 'PUT',
    headers: { 'Content-Type': 'application/json', 'If-Match': `"${version}"` },
    body: JSON.stringify(snapshot),
    keepalive: leaving,
  })
  if (response.ok) return { kind: 'saved', version: ((await response.json()) as { version: number }).version }
  const details = await problemOf(response)
  if (response.status === 412) return { kind: 'stale' }
  if (response.status === 401) {
    return { kind: 'unreachable', message: 'You are signed out. Sign in again in another tab; your words stay here.' }
  }
  if (response.status === 429 || response.status >= 500) return { kind: 'unreachable', ...retryAfter(response) }
  return { kind: 'refused', message: details.title ?? 'The club does not take this as it is.', problems: details.errors ?? [] }
}

/** What the club has now; null when it cannot be reached. */
async function fetchCopy(id: string): Promise<ClubCopy | null> {
  try {
    const response = await fetch(`/api/edits/${id}`, { cache: 'no-store' })
    if (!response.ok) return null
    const { content, summary, version, updatedAt } = (await response.json()) as ClubCopy
    return { content, summary, version, updatedAt }
  } catch {
    return null
  }
}

/** The draft as it would be printed. Rejects only when it is called off. */
async function fetchPreview(content: GuideDraft, signal: AbortSignal): Promise<PreviewAnswer> {
  try {
    const response = await fetch('/api/preview', {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ content }),
      signal,
    })
    if (response.ok) return { kind: 'ready', preview: (await response.json()) as Preview }
    if (response.status === 429 || response.status >= 500) return { kind: 'away', ...retryAfter(response) }
    const { title, errors } = await problemOf(response)
    return { kind: 'refused', message: errors?.map(({ message }) => message).join(' ') || (title ?? 'This cannot be laid out.') }
  } catch (error) {
    if (signal.aborted) throw error
    return { kind: 'away' }
  }
}

function retryAfter(response: Response): { retryAfterSeconds?: number } {
  const seconds = Number(response.headers.get('Retry-After'))
  return Number.isFinite(seconds) && seconds > 0 ? { retryAfterSeconds: seconds } : {}
}

async function problemOf(response: Response): Promise<ProblemDetails> {
  try {
    return (await response.json()) as ProblemDetails
  } catch {
    return {}
  }
}
