export { beginEdit, ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE }
export type { Agent }

import type supertest from 'supertest'
import type { EditView } from '#server/edits/index.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { TestApp } from '../support/test-app.ts'

type Agent = ReturnType<typeof supertest.agent>

/** A guide that can be published as it stands. */
const WHOLE_GUIDE: GuideDraft = {
  title: 'Gluing tyres',
  inShort: 'A tyre that is glued well stays on its rim and runs true.',
  answers: [],
  bench: { reachFor: '', moveBy: '', youGiveUp: '', takes: '' },
  body: '## Clean first\n\nGlue holds on bare rubber only.\n',
  effects: [
    {
      adjustable: 'tyre_insert', direction: 'up', phase: 'middle', quality: 'steering', change: 'more', strength: 1,
      surfaces: ['loam'], bites: [], carClasses: [], mirrors: true, basis: 'common_practice', note: '',
    },
  ],
  sources: [{ kind: 'common_practice', text: 'How the club does it', url: '' }],
}

function ifMatch(edit: { version: number }): [string, string] {
  return ['If-Match', `"${edit.version}"`]
}

async function beginEdit(agent: Agent, start: { guideSlug: string; restoreEdition?: number } | { chapter: string }): Promise<EditView> {
  const answer = await agent.post('/api/edits').send(start)
  if (answer.status !== 201) throw new Error(`POST /api/edits: ${answer.status} ${answer.text.slice(0, 300)}`)
  return answer.body as EditView
}

async function saveEdit(agent: Agent, edit: EditView, change: Partial<GuideDraft>, summary = edit.summary): Promise<EditView> {
  const answer = await agent
    .put(`/api/edits/${edit.id}`)
    .set(...ifMatch(edit))
    .send({ content: { ...edit.content, ...change }, summary })
  if (answer.status !== 200) throw new Error(`PUT /api/edits/${edit.id}: ${answer.status} ${answer.text.slice(0, 300)}`)
  return answer.body as EditView
}

/** Begins an edit, changes it and hands it in. */
async function sentEdit(
  agent: Agent,
  start: { guideSlug: string } | { chapter: string },
  change: Partial<GuideDraft>,
  summary = 'Says it better',
): Promise<EditView> {
  const saved = await saveEdit(agent, await beginEdit(agent, start), change, summary)
  const answer = await agent.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({})
  if (answer.status !== 200) throw new Error(`send: ${answer.status} ${answer.text.slice(0, 300)}`)
  return answer.body as EditView
}

/** Rows straight from the database, past the server. */
async function rows<Row = Record<string, unknown>>(app: TestApp, statement: string, values: unknown[] = []): Promise<Row[]> {
  const result = await app.app.connection.pool.query(statement, values)
  return result.rows as Row[]
}
