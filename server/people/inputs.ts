export {
  AskForReset, ChangePassword, ChangeRole, ChangeStatus, EmailAddress, EndSessions, Join, MemberName, RedeemReset,
  ResendVerification, SignIn, VerifyEmail,
}

import { z } from 'zod'
import { MEMBER_ROLES } from '#shared/vocabulary/roles.ts'
import { cleanText } from '#shared/schemas/text.ts'

/**
 * Plain ASCII addresses only: two addresses that look alike in Unicode, or become alike when a mail server folds them,
 * must never reach one account.
 */
const EmailAddress = z
  .string({ error: 'E-mail: write your address.' })
  .trim()
  .max(254, { error: 'E-mail: keep it under 255 characters.' })
  .pipe(z.email({ error: 'E-mail: write an address such as name@club.example.' }))

// Invisible marks (direction overrides, zero-width spaces) can make one name look like another. The two joiners stay:
// some scripts cannot be written without them.
const invisible = /(?![\u200c\u200d])\p{Cf}/u

const MemberName = cleanText('Name', 2, 60).refine((name) => !invisible.test(name), {
  error: 'Name: it holds a character that cannot be seen. Type it instead of pasting it.',
})

/** A new password as typed. Its rules are in password-rules.ts, since they need to know whose it will be. */
const NewPassword = z.string({ error: 'Password: write one.' })

/** A password to compare. Anything over the longest allowed is simply wrong, so there is no limit to tell about. */
const GivenPassword = z.string({ error: 'Password: write it here.' }).min(1, { error: 'Password: write it here.' })

const Secret = z.string({ error: 'Open the link from the mail again.' })

const Join = z.strictObject({ name: MemberName, email: EmailAddress, password: NewPassword })
const SignIn = z.strictObject({ email: EmailAddress, password: GivenPassword })
const VerifyEmail = z.strictObject({ token: Secret })
const ResendVerification = z.strictObject({ email: EmailAddress })
const AskForReset = z.strictObject({ email: EmailAddress })
const RedeemReset = z.strictObject({ token: Secret, password: NewPassword })
const ChangePassword = z.strictObject({ currentPassword: GivenPassword, newPassword: NewPassword })

const MemberId = z.uuid({ error: 'That is no member here.' })
const ChangeRole = z.strictObject({
  memberId: MemberId,
  role: z.enum(MEMBER_ROLES, { error: 'Role: choose member, moderator or admin.' }),
})
const ChangeStatus = z.strictObject({
  memberId: MemberId,
  status: z.enum(['active', 'suspended'], { error: 'Choose active or suspended.' }),
})
const EndSessions = z.strictObject({ memberId: MemberId })
