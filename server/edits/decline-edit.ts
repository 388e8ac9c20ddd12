export { declineEdit }

import type { ServiceContext } from '../context.ts'
import { sendBack } from './send-back.ts'
import type { EditView } from './views.ts'

/** Closes an edit with the reason why it is not taken. */
async function declineEdit(ctx: ServiceContext, input: { id: string; version: number; reason: string }): Promise<EditView> {
  return sendBack(ctx, 'decline', input)
}
