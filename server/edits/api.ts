export { ListQuery, editsApi }

import { Router, type Request, type RequestHandler, type Response } from 'express'
import { z } from 'zod'
import type { App, ServiceContext } from '../context.ts'
import { ValidationError } from '../errors.ts'
import { idempotent } from '../http/idempotency.ts'
import { sendVersion, versionFromIfMatch } from '../http/if-match.ts'
import { pageNumber } from '../http/page-number.ts'
import { can } from '../people/permissions.ts'
import { parseInput } from '../people/parse-input.ts'
import { EDIT_STATES } from '#shared/vocabulary/edit-states.ts'
import { addNote } from './add-note.ts'
import { approveEdit } from './approve-edit.ts'
import { askForChanges } from './ask-for-changes.ts'
import { createEdit } from './create-edit.ts'
import { declineEdit } from './decline-edit.ts'
import { getEdit } from './get-edit.ts'
import { listEdits } from './list-edits.ts'
import { loadEdit } from './load-edit.ts'
import { mergeEdit } from './merge-edit.ts'
import { previewGuide } from './preview-guide.ts'
import { rebaseEdit } from './rebase-edit.ts'
import { saveEdit } from './save-edit.ts'
import { sendEdit } from './send-edit.ts'
import { withdrawEdit } from './withdraw-edit.ts'
import type { EditView } from './views.ts'

const ListQuery = z.strictObject({
  state: z.enum(EDIT_STATES, { error: 'State: choose one of ' + EDIT_STATES.join(', ') + '.' }).optional(),
  whose: z.enum(['mine', 'everyone'], { error: 'Whose: mine or everyone.' }).optional(),
  page: pageNumber.optional(),
})

type EditRequest = Request<{ id: string }>

/** Writing and approving as JSON. Every change of an edit carries `If-Match` with the version it was made for. */
function editsApi(app: App): Router {
  const router = Router()
  const once = idempotent(app)

  router.get('/edits', async (req, res) => {
    const query = parseInput(ListQuery, req.query)
    const queue = can(req.ctx.actor, 'queue.read') && query.state !== undefined && query.state !== 'draft'
    const list = await listEdits(req.ctx, { ...query, whose: query.whose ?? (queue ? 'everyone' : 'mine') })
    res.setHeader('X-Total-Count', String(list.total))
    res.json(list.edits)
  })
  router.post('/edits', once, async (req, res) => {
    const { edit, created } = await createEdit(req.ctx, req.body)
    sendVersion(res, edit)
    res.status(created ? 201 : 200).location(`/api/edits/${edit.id}`).json(edit)
  })
  router.get('/edits/:id', async (req, res) => {
    const edit = await getEdit(req.ctx, req.params.id)
    sendVersion(res, edit)
    // The ETag stands for text and state. Where something else is newer, a cached copy is out of date all the same.
    if (edit.baseMoved !== null || edit.notes.some((note) => note.createdAt > edit.updatedAt)) delete req.headers['if-none-match']
    res.json(edit)
  })
  router.put('/edits/:id', change(saveEdit))
  router.post('/edits/:id/send', once, change(sendEdit))
  router.post('/edits/:id/withdraw', once, change(withdrawEdit))
  router.post('/edits/:id/merge', once, change(mergeEdit))
  router.post('/edits/:id/rebase', once, change(rebaseEdit))
  router.post('/edits/:id/ask', once, change(askForChanges))
  router.post('/edits/:id/decline', once, change(declineEdit))
  router.post('/edits/:id/approve', once, async (req: EditRequest, res: Response) => {
    const { edit, slug, edition } = await approveEdit(req.ctx, await versioned<Parameters<typeof approveEdit>[1]>(req))
    sendVersion(res, edit)
    res.json({ edit, slug, edition })
  })
  router.post('/edits/:id/notes', once, async (req: EditRequest, res: Response) => {
    res.status(201).json(await addNote(req.ctx, { ...bodyOf(req), id: req.params.id } as Parameters<typeof addNote>[1]))
  })
  router.post('/preview', async (req, res) => {
    res.json(await previewGuide(req.ctx, req.body))
  })
  return router
}

/** A handler for one change of an edit: version from If-Match, answer with the edit and its new ETag. */
function change<Input>(act: (ctx: ServiceContext, input: Input) => Promise<EditView>): RequestHandler<{ id: string }> {
  return async (req, res) => {
    const edit = await act(req.ctx, await versioned<Input>(req))
    sendVersion(res, edit)
    res.json(edit)
  }
}

/**
 * What a service gets: the body, the id from the address and the version from If-Match. The type is only what the
 * service asks for: it checks every value itself.
 */
async function versioned<Input>(req: EditRequest): Promise<Input> {
  const { version } = await loadEdit(req.ctx, req.params.id, 'edit.read')
  return { ...bodyOf(req), id: req.params.id, version: versionFromIfMatch(req, version) } as Input
}

function bodyOf(req: EditRequest): Record<string, unknown> {
  const body = (req.body ?? {}) as Record<string, unknown>
  const misplaced = ['id', 'version'].filter((key) => Object.hasOwn(body, key))
  if (misplaced.length > 0) {
    throw new ValidationError(
      'The id stands in the address and the version in If-Match.',
      misplaced.map((field) => ({ field, message: `“${field}” is not a field here.` })),
    )
  }
  return body
}
