export { title }

import type { PageContextServer } from 'vike/types'

function title(pageContext: PageContextServer): string {
  return pageContext.is404 ? 'No such page · Camber & Clay' : 'Not possible · Camber & Clay'
}
