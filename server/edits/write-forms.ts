export { writeForms }

import { Router, type Request } from 'express'
import type { ServiceContext } from '../context.ts'
import { NotFoundError } from '../errors.ts'
import { flatFields, formVersion } from '../http/form-body.ts'
import { isUuid } from '../http/uuid.ts'
import { fieldsToGuide, guideToFields, type FormFields } from '#shared/editing/form-fields.ts'
import { changeRows, rowAction } from '#shared/editing/form-rows.ts'
import { withoutEmptyRows } from '#shared/editing/whole-rows.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import { answerEditForm } from './answer-form.ts'
import { createEdit } from './create-edit.ts'
import { mergeEdit } from './merge-edit.ts'
import { rebaseEdit } from './rebase-edit.ts'
import { saveEdit } from './save-edit.ts'
import { sendEdit } from './send-edit.ts'
import { withdrawEdit } from './withdraw-edit.ts'

/** The write pages’ forms, for browsers without JavaScript too. */
function writeForms(): Router {
  const router = Router()
  router.post('/write', async (req, res) => {
    const fields = flatFields(req.body)
    await answerEditForm(req, res, { url: '/write', values: () => fields }, async () => {
      const { edit, created } = await createEdit(req.ctx, startingPoint(fields))
      return `/write/${edit.id}${created ? '' : '?said=found'}`
    })
  })
  router.post('/write/:id', async (req, res) => {
    const form = writeForm(req, editId(req))
    await answerEditForm(req, res, { url: `/write/${form.id}`, values: () => form.fields }, () => act(req.ctx, form))
  })
  router.post('/write/:id/withdraw', async (req, res) => {
    const id = editId(req)
    const fields = flatFields(req.body)
    await answerEditForm(req, res, { url: `/write/${id}`, values: () => ({}) }, async () => {
      await withdrawEdit(req.ctx, { id, version: formVersion(fields) })
      return '/write?said=withdrawn'
    })
  })
  router.post('/write/:id/rebase', async (req, res) => {
    const id = editId(req)
    const fields = flatFields(req.body)
    await answerEditForm(req, res, { url: `/write/${id}`, values: () => ({}) }, async () => {
      await rebaseEdit(req.ctx, { id, version: formVersion(fields) })
      return `/write/${id}?said=rebased`
    })
  })
  return router
}

function editId(req: Request): string {
  const id = String(req.params['id'])
  if (!isUuid(id)) throw new NotFoundError('edit', id)
  return id
}

function startingPoint(fields: FormFields): Parameters<typeof createEdit>[1] {
  const { guideSlug, chapter, wanted, restoreEdition } = fields
  if (guideSlug === undefined) return { chapter: chapter ?? '', ...(wanted ? { wanted } : {}) }
  return restoreEdition === undefined ? { guideSlug } : { guideSlug, restoreEdition: Number(restoreEdition) }
}

/** What the page shows again if something is wrong; `fields` follows what was already stored. */
interface WriteForm {
  id: string
  button: string
  fields: FormFields
}

function writeForm(req: Request, id: string): WriteForm {
  const { do: button = 'save', ...fields } = flatFields(req.body)
  const rows = rowAction(button)
  if (rows !== null) return { id, button, fields: changeRows(fields, rows) }
  // Rows that were opened and left blank go now, so that the numbers of what is wrong are those of what is shown.
  const { version, summary, baseEdition } = fields
  const kept = Object.entries({ version, summary, baseEdition }).filter((entry): entry is [string, string] => entry[1] !== undefined)
  const tidy = withoutEmptyRows(fieldsToGuide(fields) as GuideDraft)
  return { id, button, fields: { ...guideToFields(tidy), ...Object.fromEntries(kept) } }
}

/** Does what the button says. @returns where to go on */
async function act(ctx: ServiceContext, form: WriteForm): Promise<string> {
  const { id, button } = form
  const page = `/write/${id}`
  const content = fieldsToGuide(form.fields) as GuideDraft
  const summary = form.fields['summary'] ?? ''
  const version = formVersion(form.fields)
  if (button === 'merge') {
    await mergeEdit(ctx, {
      id, version, content, baseEdition: Number(form.fields['baseEdition']), ...(summary.trim() === '' ? {} : { summary }),
    })
    return `${page}?said=merged`
  }
  const saved = await saveEdit(ctx, { id, version, content, summary })
  form.fields['version'] = String(saved.version)
  const rows = rowAction(button)
  if (rows !== null) return `${page}#${rows.list}`
  if (button === 'preview') return `${page}?show=preview#preview`
  if (button !== 'send') return `${page}?said=saved`
  const sent = await sendEdit(ctx, { id, version: saved.version, summary })
  return `${page}?said=${sent.merged ? 'sent_merged' : 'sent'}`
}
