export { reviewForms }

import { Router, type Request } from 'express'
import { NotFoundError } from '../errors.ts'
import { flatFields, formVersion } from '../http/form-body.ts'
import { isUuid } from '../http/uuid.ts'
import type { FormFields } from '#shared/editing/form-fields.ts'
import { addNote } from './add-note.ts'
import { answerEditForm } from './answer-form.ts'
import { approveEdit } from './approve-edit.ts'
import { askForChanges } from './ask-for-changes.ts'
import { declineEdit } from './decline-edit.ts'
import { rebaseEdit } from './rebase-edit.ts'

type Deed = (req: Request, id: string, fields: FormFields) => Promise<string>

/** Each returns where to go on. */
const deeds: Record<string, Deed> = {
  approve: async (req, id, fields) => {
    const { slug } = await approveEdit(req.ctx, { id, version: formVersion(fields), note: fields['note'] ?? '' })
    return `/guides/${slug}?said=published`
  },
  ask: async (req, id, fields) => {
    await askForChanges(req.ctx, { id, version: formVersion(fields), reason: fields['reason'] ?? '' })
    return '/review?said=asked'
  },
  decline: async (req, id, fields) => {
    await declineEdit(req.ctx, { id, version: formVersion(fields), reason: fields['reason'] ?? '' })
    return '/review?said=declined'
  },
  note: async (req, id, fields) => {
    await addNote(req.ctx, { id, text: fields['text'] ?? '' })
    return `${fields['back'] === 'write' ? '/write' : '/review'}/${id}?said=noted#notes`
  },
  rebase: async (req, id, fields) => {
    await rebaseEdit(req.ctx, { id, version: formVersion(fields) })
    return `/review/${id}?said=rebased`
  },
}

/** The review page’s forms. */
function reviewForms(): Router {
  const router = Router()
  for (const [name, deed] of Object.entries(deeds)) {
    router.post(`/review/:id/${name}`, async (req, res) => {
      const { id } = req.params
      if (!isUuid(id)) throw new NotFoundError('edit', id)
      const fields = flatFields(req.body)
      const url = fields['back'] === 'write' ? `/write/${id}` : `/review/${id}`
      await answerEditForm(req, res, { url, values: () => fields }, () => deed(req, id, fields))
    })
  }
  return router
}
