export { flatFields, formVersion, renameFields }

import { AppError } from '../errors.ts'

/** A posted form as flat texts. Of a field that was posted twice the last counts. */
function flatFields(body: unknown): Record<string, string> {
  return Object.fromEntries(
    Object.entries((body ?? {}) as Record<string, unknown>).flatMap(([name, value]) => {
      const text: unknown = Array.isArray(value) ? value.at(-1) : value
      return typeof text === 'string' ? [[name, text]] : []
    }),
  )
}

/** The version a form was made for; one that nobody has where it is missing or no number, so that it counts as stale. */
function formVersion(fields: Readonly<Record<string, string>>): number {
  return /^\d{1,9}$/.test(fields['version'] ?? '') ? Number(fields['version']) : -1
}

/** The same error with the names that the fields have in the form: `body` for the input's `content.body`. */
function renameFields(error: AppError, toForm: (field: string) => string): AppError {
  const fields = error.fields.map(({ field, message }) => ({ field: toForm(field), message }))
  return new AppError(error.code, error.status, error.message, { fields, details: error.details, cause: error })
}
