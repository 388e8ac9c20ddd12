export { answerWithForm, formValues }

import type { Request, Response } from 'express'
import type { AppError } from '../errors.ts'
import { renderBookPage } from './render-page.ts'

const neverShownAgain = /password/i

/** The typed values of a posted form, by field name, without passwords. */
function formValues(body: unknown): Record<string, string> {
  return Object.fromEntries(
    Object.entries((body ?? {}) as Record<string, unknown>).flatMap(([name, value]) =>
      typeof value === 'string' && !neverShownAgain.test(name) ? [[name, value]] : [],
    ),
  )
}

/**
 * Shows a form's page again with what was typed and with words at each field, under the status of the error.
 * @param options.url the page that holds the form
 */
async function answerWithForm(
  req: Request,
  res: Response,
  options: { url: string; error: AppError; values?: Record<string, string> },
): Promise<void> {
  const { retryAfter } = options.error.details
  if (typeof retryAfter === 'number') res.setHeader('Retry-After', String(retryAfter))
  await renderBookPage(req, res, {
    url: options.url,
    status: options.error.status,
    form: {
      values: options.values ?? formValues(req.body),
      problems: options.error.fields,
      message: options.error.message,
    },
  })
}
