export {
  AppError, ConflictError, ForbiddenError, NotFoundError, PreconditionFailedError, PreconditionRequiredError,
  SignInRequiredError, TooManyRequestsError, ValidationError, isAppError, validationErrorFromZod,
}
export type { FieldProblem }

import type { z } from 'zod'

/** One thing wrong with one field; `field` is a dotted path such as `content.effects.0.adjustable`. */
interface FieldProblem {
  field: string
  message: string
}

/**
 * An error that a person can do something about. The domain throws it; the HTTP edge turns it into problem details
 * (RFC 9457) or an error page. Anything else that is thrown becomes a bare 500 with an id to quote.
 */
class AppError extends Error {
  /** Marks the family across module copies: page data code is bundled separately, so `instanceof` would lie. */
  readonly isAppError = true
  readonly code: string
  readonly status: number
  readonly fields: FieldProblem[]
  /** Further members of the problem details, safe to show. */
  readonly details: Record<string, unknown>

  constructor(
    code: string,
    status: number,
    message: string,
    more: { fields?: FieldProblem[]; details?: Record<string, unknown>; cause?: unknown } = {},
  ) {
    super(message, { cause: more.cause })
    this.name = new.target.name
    this.code = code
    this.status = status
    this.fields = more.fields ?? []
    this.details = more.details ?? {}
  }
}

class NotFoundError extends AppError {
  constructor(kind: string, id: string) {
    super('not_found', 404, `There is no ${kind} “${id}” here.`)
  }
}

class SignInRequiredError extends AppError {
  constructor(toDoWhat = 'do that') {
    super('sign_in_required', 401, `Sign in to ${toDoWhat}.`)
  }
}

class ForbiddenError extends AppError {
  constructor(message: string) {
    super('forbidden', 403, message)
  }
}

class ValidationError extends AppError {
  constructor(message: string, fields: FieldProblem[] = []) {
    super('invalid', 422, message, { fields })
  }
}

class ConflictError extends AppError {
  constructor(code: string, message: string, details: Record<string, unknown> = {}) {
    super(code, 409, message, { details })
  }
}

class PreconditionFailedError extends AppError {
  constructor(message: string, details: Record<string, unknown> = {}) {
    super('precondition_failed', 412, message, { details })
  }
}

class PreconditionRequiredError extends AppError {
  constructor(message: string) {
    super('precondition_required', 428, message)
  }
}

class TooManyRequestsError extends AppError {
  constructor(message: string, retryAfterSeconds: number) {
    super('too_many_requests', 429, message, { details: { retryAfter: retryAfterSeconds } })
  }
}

function isAppError(error: unknown): error is AppError {
  return typeof error === 'object' && error !== null && (error as { isAppError?: unknown }).isAppError === true
}

/** Turns what zod found into words at the field. The schemas carry the messages. */
function validationErrorFromZod(error: z.ZodError, message = 'Some of this needs another look.'): ValidationError {
  const fields = error.issues.flatMap((issue) => {
    const path = issue.path.join('.')
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        field: path === '' ? key : `${path}.${key}`,
        message: `“${key}” is not a field here.`,
      }))
    }
    return [{ field: path, message: issue.message }]
  })
  return new ValidationError(message, fields)
}
