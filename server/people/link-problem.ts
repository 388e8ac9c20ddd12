export { linkNoLongerWorks }

import { ValidationError } from '../errors.ts'
import type { TokenPurpose } from './tokens.ts'

const howToGetAnother: Record<TokenPurpose, string> = {
  verify: 'Sign in and ask for a new one on your page.',
  reset: 'Ask for a new one.',
}

/** One answer for unknown, used, replaced and old links: which it was helps nobody but a guesser. */
function linkNoLongerWorks(purpose: TokenPurpose): ValidationError {
  return new ValidationError(
    `This link does not work any more. Each works once, for a while, and only the newest. ${howToGetAnother[purpose]}`,
    [{ field: 'token', message: 'This link does not work any more.' }],
  )
}
