export { RenderRefusedError }
export type { RefusalCode }

import { AppError } from '#server/errors.ts'

type RefusalCode = 'too_long' | 'too_deep' | 'too_many_tokens' | 'too_heavy' | 'timed_out' | 'busy'

/**
 * The text was not rendered at all, and the message says what to do about it. All codes are about the text
 * (422) but `busy` (503): too many texts, or too many of the same member's, were waiting already, and the same text will
 * pass a little later.
 */
class RenderRefusedError extends AppError {
  declare readonly code: RefusalCode

  constructor(code: RefusalCode, message: string) {
    super(code, code === 'busy' ? 503 : 422, message, {
      fields: code === 'busy' ? [] : [{ field: 'body', message }],
    })
  }
}
