export { askForChanges }

import type { ServiceContext } from '../context.ts'
import { sendBack } from './send-back.ts'
import type { EditView } from './views.ts'

/** Gives an edit back to its writer with what should change; it can be sent again. */
async function askForChanges(ctx: ServiceContext, input: { id: string; version: number; reason: string }): Promise<EditView> {
  return sendBack(ctx, 'ask', input)
}
