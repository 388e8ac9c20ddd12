export { usePageReader, placesFor }
export type { PageReader, Place }

import { computed, type ComputedRef } from 'vue'
import { usePageContext } from 'vike-vue/usePageContext'
import { roleAtLeast, type MemberRole } from '#shared/vocabulary/roles.ts'

/** The signed-in member as a layout needs to know them. */
interface PageReader {
  id: string
  name: string
  role: MemberRole
  /** Edits waiting at the review desk. */
  waiting?: number
}

/** A place in the masthead; `current` when the page shown stands there. */
interface Place {
  href: string
  name: string
  current: boolean
  /** A number to show beside the name, and its words for screen readers. */
  count?: { figure: number; words: string }
}

const places = [
  { href: '/feel', name: 'By feel' },
  { href: '/chapters', name: 'Chapters' },
  { href: '/calculators', name: 'Calculators' },
  { href: '/my-car', name: 'My car' },
  { href: '/glossary', name: 'Glossary' },
  { href: '/write', name: 'Write' },
]

/** The places this reader may go to, in their fixed order; the review desk only for who can decide there. */
function placesFor(reader: Omit<PageReader, 'id'> | null, path: string): Place[] {
  const shown: Place[] = places.map((place) => ({ ...place, current: standsIn(place.href, path) }))
  if (reader !== null && roleAtLeast(reader.role, 'moderator')) {
    const waiting = reader.waiting ?? 0
    const count = waiting > 0 ? { figure: waiting, words: `${waiting} waiting` } : undefined
    shown.push({ href: '/review', name: 'Review desk', current: standsIn('/review', path), count })
  }
  return shown
}

// A guide belongs to the chapters, and the front page and the parts of the lap to by feel: that is where they lead.
function standsIn(place: string, path: string): boolean {
  if (place === '/feel' && (path === '/' || path.startsWith('/lap/'))) return true
  if (place === '/chapters' && path.startsWith('/guides/')) return true
  return path === place || path.startsWith(`${place}/`)
}

interface PageState {
  reader: PageReader | null
  path: string
  sheet: 'day' | 'night' | null
  club: string
}

/** Who reads the page, where it stands and on which sheet, from the page context. */
function usePageReader(): ComputedRef<PageState> {
  const context = usePageContext() as ReturnType<typeof usePageContext> & Omit<PageState, 'path'>
  return computed(() => ({
    reader: context.reader ?? null,
    path: context.urlPathname,
    sheet: context.sheet ?? null,
    club: context.club ?? 'Saltmarsh Flats R/C',
  }))
}
