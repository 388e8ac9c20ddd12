export { sendBack }

import type { ServiceContext } from '../context.ts'
import { constraintBroken } from '../db/pg-errors.ts'
import { reviews } from '../db/schema/index.ts'
import { ConflictError } from '../errors.ts'
import { queueMail } from '../mail/outbox.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { recordAudit } from '../records/audit.ts'
import { changeEdit, requireState, requireVersion } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { ReasonInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import { askedMail, declinedMail } from './mails.ts'
import type { EditView } from './views.ts'
import { wordsHandedIn } from './words-handed-in.ts'

const outcomes = {
  ask: { state: 'changes_asked', mail: askedMail },
  decline: { state: 'declined', mail: declinedMail },
} as const

/** What asking for changes and declining have in common: a reason, the decision, the record and the mail, in one transaction. */
async function sendBack(
  ctx: ServiceContext,
  decision: 'ask' | 'decline',
  { id, ...input }: { id: string; version: number; reason: string },
): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.decide')
  const { actor } = ctx
  requirePermission(actor, 'edit.decide', edit)
  await ctx.rateLimits.take('write', actor.id)
  const { version, reason } = parseInput(ReasonInput, input)
  requireState(edit, decision)
  requireVersion(edit, version)
  const { state, mail } = outcomes[decision]
  try {
    await ctx.db.transaction(async (tx) => {
      await changeEdit(tx, { id, version }, decision, { state })
      await tx.insert(reviews).values({ editId: id, editVersion: version, reviewerId: actor.id, decision, reason, decidedAt: ctx.clock() })
      await recordAudit({ ...ctx, db: tx }, {
        action: `edit.${decision}`, subjectKind: 'edit', subjectId: id, details: { version, ...(decision === 'ask' ? { words: wordsHandedIn(edit) } : {}) },
      })
      if (edit.author.email !== null) {
        const { email: to, name } = edit.author
        await queueMail(tx, mail({ config: ctx.config, to, name, title: edit.title, moderator: actor.name, editId: id, reason }))
      }
    })
  } catch (error) {
    if (constraintBroken(error, 'reviews_once_a_version')) {
      throw new ConflictError('wrong_state', 'Someone else decided on this edit just now.')
    }
    throw error
  }
  return editView(ctx, id)
}
