export { asHandedIn, entriesAsHandedIn, wordsHandedIn }

import { and, desc, eq, inArray, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { auditEntries } from '../db/schema/index.ts'
import { emptyGuideContent } from '#shared/schemas/guide-content.ts'
import type { EditState } from '#shared/vocabulary/edit-states.ts'
import type { EditRow } from './edit-row.ts'

/** What moderators had before them when they asked for changes. */
type WordsHandedIn = Pick<EditRow, 'content' | 'summary' | 'changes' | 'baseEditionId' | 'baseEdition'>

/** For the record of asking: the writer goes on in the edit itself, so this is where what was handed in stays. */
function wordsHandedIn({ content, summary, changes, baseEditionId, baseEdition }: EditRow): WordsHandedIn {
  return { content, summary, changes, baseEditionId, baseEdition }
}

/** An entry of the record that kept no words: then nothing is shown, rather than what was never sent. */
const nothing: WordsHandedIn = { content: emptyGuideContent(), summary: '', changes: null, baseEditionId: null, baseEdition: null }

/** An edit as others than its writer may see it: as it was handed in, never with what was rewritten since and not sent. */
async function asHandedIn(ctx: Pick<ServiceContext, 'db'>, row: EditRow): Promise<EditRow> {
  const asked = (await lastAsked(ctx, [row], sql<WordsHandedIn | null>`${auditEntries.details} -> 'words'`)).get(row.id)
  if (asked === undefined) return row
  const words = asked.kept ?? { ...nothing, baseEditionId: row.baseEditionId, baseEdition: row.baseEdition }
  return { ...row, ...words, title: words.content.title, updatedAt: asked.at }
}

type ListedRow = Omit<EditRow, 'content'>
type ListedWords = Pick<EditRow, 'title' | 'summary' | 'changes' | 'baseEdition'>

/** The same for a list, without the texts. */
async function entriesAsHandedIn(ctx: Pick<ServiceContext, 'db'>, rows: ListedRow[]): Promise<ListedRow[]> {
  const { details } = auditEntries
  const asked = await lastAsked(
    ctx,
    rows,
    sql<ListedWords | null>`(${details} -> 'words') - 'content' - 'baseEditionId' || jsonb_build_object('title', ${details} #> '{words,content,title}')`,
  )
  return rows.map((row) => {
    const own = asked.get(row.id)
    return own === undefined ? row : { ...row, ...(own.kept ?? { title: '', summary: '', changes: null }), updatedAt: own.at }
  })
}

/** Of those edits that were given back and not handed in again since: what was kept of them then, and when. */
async function lastAsked<Kept>(
  ctx: Pick<ServiceContext, 'db'>,
  edits: readonly { id: string; state: EditState }[],
  kept: ReturnType<typeof sql<Kept>>,
): Promise<Map<string, { kept: Kept; at: Date }>> {
  const ids = edits.filter(({ state }) => state === 'changes_asked' || state === 'withdrawn').map(({ id }) => id)
  if (ids.length === 0) return new Map()
  const { action, at, id, subjectId, subjectKind } = auditEntries
  const last = await ctx.db
    .selectDistinctOn([subjectId], { subjectId, action, at, kept })
    .from(auditEntries)
    .where(and(eq(subjectKind, 'edit'), inArray(subjectId, ids), inArray(action, ['edit.send', 'edit.ask'])))
    .orderBy(subjectId, desc(id))
  return new Map(last.flatMap((entry) => (entry.action === 'edit.ask' ? [[entry.subjectId, entry] as const] : [])))
}
