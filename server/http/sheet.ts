export { sheetOf }

import type { Request } from 'express'
import type { Sheet } from './page-context.ts'

/** The sheet that the reader has pinned by `POST /sheet`; null follows the system. */
function sheetOf(req: Request): Sheet {
  const chosen = /(?:^|;\s*)sheet=(day|night)(?:;|$)/.exec(req.headers.cookie ?? '')?.[1]
  return chosen === 'day' || chosen === 'night' ? chosen : null
}
