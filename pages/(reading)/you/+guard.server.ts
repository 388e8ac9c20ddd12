export { guard }

import type { PageContextServer } from 'vike/types'
import { forPage } from '#server/http/page-abort.ts'
import { requireSignedIn } from '#server/people/permissions.ts'

async function guard(pageContext: PageContextServer): Promise<void> {
  await forPage(pageContext, () => requireSignedIn(pageContext.ctx.actor, 'see your page'))
}
