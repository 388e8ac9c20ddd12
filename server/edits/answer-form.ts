export { answerEditForm }

import type { Request, Response } from 'express'
import { isAppError } from '../errors.ts'
import { answerWithForm } from '../http/forms.ts'
import { answerSignedOut } from '../people/signed-out-form.ts'
import type { FormFields } from '#shared/editing/form-fields.ts'
import { toFormProblems } from './form-body.ts'

const shownAtTheForm = new Set([409, 412, 422, 429, 503])

/**
 * Carries out a posted form. What the person can mend is shown on the same page again, with everything they typed; who
 * is no longer signed in gets their text back beside the sign-in form; anything else goes to the error page.
 * @param values what the page shows again; where the edit was changed meanwhile it gets the new version, so that
 *   sending once more is a decision and not a dead end
 */
async function answerEditForm(
  req: Request,
  res: Response,
  { url, values }: { url: string; values: () => FormFields },
  act: () => Promise<string>,
): Promise<void> {
  let next: string
  try {
    next = await act()
  } catch (error) {
    if (isAppError(error) && error.status === 401 && (await answerSignedOut(req, res, { page: url, error, fields: values() }))) return
    if (!isAppError(error) || !shownAtTheForm.has(error.status)) throw error
    const { version } = error.details
    const again: FormFields = error.status === 412 && typeof version === 'number' ? { version: String(version) } : {}
    await answerWithForm(req, res, { url, error: toFormProblems(error), values: { ...values(), ...again } })
    return
  }
  res.redirect(303, next)
}
