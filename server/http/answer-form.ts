export { answerForm }

import type { Request, Response } from 'express'
import { isAppError } from '../errors.ts'
import { answerSignedOut } from '../people/signed-out-form.ts'
import { renameFields } from './form-body.ts'
import { answerWithForm } from './forms.ts'

const shownAtTheForm = new Set([409, 412, 422, 429, 503])

/**
 * Carries out a posted form. What the person can mend is shown on the same page again, with everything they typed; who
 * is no longer signed in gets their words back beside the sign-in form; anything else goes to the error page.
 * @param form.values what the page shows again; where the thing was changed meanwhile it gets the new version, so that
 *   sending once more is a decision and not a dead end
 * @param form.fieldName what a field of the input is called in the form
 * @param act returns where to go on
 */
async function answerForm(
  req: Request,
  res: Response,
  { url, values, fieldName }: { url: string; values: () => Record<string, string>; fieldName: (field: string) => string },
  act: () => Promise<string>,
): Promise<void> {
  let next: string
  try {
    next = await act()
  } catch (error) {
    if (isAppError(error) && error.status === 401 && (await answerSignedOut(req, res, { page: url, error, fields: values() }))) return
    if (!isAppError(error) || !shownAtTheForm.has(error.status)) throw error
    const { version } = error.details
    const again: Record<string, string> = error.status === 412 && typeof version === 'number' ? { version: String(version) } : {}
    await answerWithForm(req, res, { url, error: renameFields(error, fieldName), values: { ...values(), ...again } })
    return
  }
  res.redirect(303, next)
}
