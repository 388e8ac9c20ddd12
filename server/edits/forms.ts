export { editsForms }

import { Router } from 'express'
import type { App } from '../context.ts'
import { reviewForms } from './review-forms.ts'
import { writeForms } from './write-forms.ts'

/** Writing and approving by plain HTML forms. */
function editsForms(_app: App): Router {
  const router = Router()
  router.use(writeForms(), reviewForms())
  return router
}
