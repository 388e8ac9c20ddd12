export { htmlAttributes }

import type { PageContextServer } from 'vike/types'

// The day sheet is the default and the night sheet follows the system, unless the reader has pinned one.
function htmlAttributes(pageContext: PageContextServer): Record<string, string> | undefined {
  return pageContext.sheet === null ? undefined : { 'data-sheet': pageContext.sheet }
}
