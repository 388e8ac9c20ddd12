export { getEdit }

import type { ServiceContext } from '../context.ts'
import { editView } from './edit-view.ts'
import type { EditView } from './views.ts'

/** One edit with its notes and decisions, for its writer and, once it was sent, for moderators; 404 for anyone else. */
async function getEdit(ctx: ServiceContext, id: string): Promise<EditView> {
  return editView(ctx, id)
}
