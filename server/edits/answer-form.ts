export { answerEditForm }

import type { Request, Response } from 'express'
import { answerForm } from '../http/answer-form.ts'
import type { FormFields } from '#shared/editing/form-fields.ts'

/** Carries out a posted form about an edit: what the input calls `content.body` is `body` in the form. */
async function answerEditForm(
  req: Request,
  res: Response,
  form: { url: string; values: () => FormFields },
  act: () => Promise<string>,
): Promise<void> {
  await answerForm(req, res, { ...form, fieldName: (field) => field.replace(/^content\./, '') }, act)
}
