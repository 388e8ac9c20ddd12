export { loadEdit }

import type { ServiceContext } from '../context.ts'
import { NotFoundError } from '../errors.ts'
import { requirePermission, requireSignedIn } from '../people/permissions.ts'
import { findEdit, type EditRow } from './edit-row.ts'
import { asHandedIn } from './words-handed-in.ts'

type EditPermission = 'edit.read' | 'edit.save' | 'edit.send' | 'edit.withdraw' | 'edit.decide' | 'edit.note'

/**
 * The edit, for someone who may see it and may do this with it. Whoever is not its writer gets it as it was handed in last.
 * @throws SignInRequiredError (401); NotFoundError (404) when there is none or it is hidden from this person;
 *   ForbiddenError (403) when it may be seen but not this be done
 */
async function loadEdit(ctx: ServiceContext, id: string, permission: EditPermission): Promise<EditRow> {
  requireSignedIn(ctx.actor, permission === 'edit.decide' ? 'decide on edits' : 'see this edit')
  const row = await findEdit(ctx, id)
  if (row === null) throw new NotFoundError('edit', id)
  // Reading first: who may not even see a draft must not learn from another refusal that it exists.
  requirePermission(ctx.actor, 'edit.read', row)
  requirePermission(ctx.actor, permission, row)
  return ctx.actor.id === row.authorId ? row : asHandedIn(ctx, row)
}
