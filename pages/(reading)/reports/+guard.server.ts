export { guard }

import type { PageContextServer } from 'vike/types'
import { forPage } from '#server/http/page-abort.ts'
import { requirePermission } from '#server/people/permissions.ts'

async function guard(pageContext: PageContextServer): Promise<void> {
  await forPage(pageContext, () => requirePermission(pageContext.ctx.actor, 'report.oversee'))
}
