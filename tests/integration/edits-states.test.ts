import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { EditView } from '#server/edits/index.ts'
import { canChangeState, EDIT_STATES, type EditAction, type EditState } from '#shared/vocabulary/edit-states.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let writer: Agent
let moderator: Agent
beforeAll(async () => {
  app = await createTestApp()
  writer = await app.signedIn('priya')
  moderator = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from rate_limits')
  await rows(app, `update edits set state = 'withdrawn', version = version + 1 where state = 'in_review'`)
})

const ACTIONS: EditAction[] = ['save', 'send', 'withdraw', 'approve', 'ask', 'decline']

async function act(edit: EditView, action: EditAction) {
  const agent = ['approve', 'ask', 'decline'].includes(action) ? moderator : writer
  const body = {
    save: { content: WHOLE_GUIDE, summary: 'A new guide' }, send: {}, withdraw: {}, approve: {},
    ask: { reason: 'A reason' }, decline: { reason: 'A reason' },
  }[action]
  const request = action === 'save' ? agent.put(`/api/edits/${edit.id}`) : agent.post(`/api/edits/${edit.id}/${action}`)
  return request.set(...ifMatch(edit)).send(body)
}

const waysTo: Record<EditState, EditAction[]> = {
  draft: [], in_review: ['send'], changes_asked: ['send', 'ask'], approved: ['send', 'approve'], declined: ['send', 'decline'], withdrawn: ['send', 'withdraw'],
}

/** An edit brought into a state over HTTP. */
async function editIn(state: EditState): Promise<EditView> {
  let edit = await saveEdit(writer, await beginEdit(writer, { chapter: 'A' }), WHOLE_GUIDE, 'A new guide')
  for (const action of waysTo[state]) {
    const answer = await act(edit, action)
    expect(answer.status).toBe(200)
    edit = (await writer.get(`/api/edits/${edit.id}`).expect(200)).body
  }
  expect(edit.state).toBe(state)
  return edit
}

describe.each(EDIT_STATES.map((state) => ({ state })))('from $state', ({ state }) => {
  it.each(ACTIONS.map((action) => ({ action, allowed: canChangeState(state, action) })))('$action: allowed $allowed', async ({ action, allowed }) => {
    const edit = await editIn(state)
    const before = await rows(app, 'select state, version, content from edits where id = $1', [edit.id])
    const answer = await act(edit, action)
    if (allowed) {
      expect(answer.status).toBe(200)
      return
    }
    // A moderator does not even see a draft, so there is nothing to conflict with.
    const hidden = state === 'draft' && ['approve', 'ask', 'decline'].includes(action)
    expect(answer.status).toBe(hidden ? 404 : 409)
    expect(answer.type).toBe('application/problem+json')
    if (!hidden) expect(answer.body).toMatchObject({ code: 'wrong_state', state })
    expect(await rows(app, 'select state, version, content from edits where id = $1', [edit.id])).toEqual(before)
  })
})

it('notes end with the edit', async () => {
  const edit = await editIn('declined')
  await writer.post(`/api/edits/${edit.id}/notes`).send({ text: 'Why?' }).expect(409)
})
