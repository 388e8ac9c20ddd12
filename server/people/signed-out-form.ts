export { answerSignedOut }

import type { Request, Response } from 'express'
import type { AppError } from '../errors.ts'
import { renderBookPage } from '../http/render-page.ts'

// What people write, of all that the forms hold; never a password, and nothing that a tick or a choice can bring back.
const WRITTEN =
  /^(?:title|inShort|body|summary|reason|text|note|bench\.\w+|answers\.\d+\.(?:heading|text)|effects\.\d+\.note|sources\.\d+\.(?:text|url)|name|value\.\w+)$/

/**
 * Answers a form that was posted after the session ended: the sign-in page (401) that also shows what was typed, to be
 * copied before signing in. It is not kept on the server, since nobody knows yet whose it is.
 * @param form.page where the form was, and where signing in leads
 * @returns false, and answers nothing, when there was nothing typed
 */
async function answerSignedOut(
  req: Request,
  res: Response,
  { page, error, fields }: { page: string; error: AppError; fields: Record<string, string> },
): Promise<boolean> {
  const typed = Object.entries(fields).filter(([name, text]) => WRITTEN.test(name) && text.trim() !== '')
  if (typed.length === 0) return false
  await renderBookPage(req, res, {
    url: `/sign-in?next=${encodeURIComponent(page)}`,
    status: 401,
    form: {
      values: { next: page, ...Object.fromEntries(typed.map(([name, text]) => [`typed.${name}`, text])) },
      problems: [],
      message: error.message,
    },
  })
  return true
}
