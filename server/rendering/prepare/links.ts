export { prepareLinks, safeHref }

import type { Token } from 'markdown-it'
import { directiveOf } from '../directives/plugin.ts'
import { headingId } from './headings.ts'
import { inlineText } from './inline-text.ts'
import type { Rendering } from './rendering.ts'
import { eachInline, hide } from './walk.ts'

const MAX_LENGTH = 2_048
/** Stands for the guide's own address while a link is read the way a browser reads it. */
const HERE = new URL('https://this-guide.invalid/guides/this')
/** Links to members' choice of sites: no handle on our window, no say in search engines. */
const OUTSIDE_REL = 'noopener nofollow ugc'

interface OpenAnchor {
  token: Token
  line: number
  index: number
  kept: boolean
}

/**
 * Keeps links to http, https, mailto and this site; of any other only the words stay, and the writer is
 * told.
 */
function prepareLinks(tokens: Token[], rendering: Rendering): void {
  const headingIds = new Set(rendering.headings.map((heading) => heading.id))
  let open: OpenAnchor[] = []

  eachInline(tokens, (token, line, index, siblings) => {
    if (index === 0) open = []
    if (token.type === 'link_open') {
      const href = safeHref(String(token.attrGet('href') ?? ''))
      const nested = open.some((anchor) => anchor.kept)
      if (href === null) {
        rendering.report(
          line,
          'bad_link',
          'A link must start with https://, http:// or mailto:, or be an address on this site such as /guides/droop.',
        )
      } else if (nested) {
        rendering.report(line, 'link_in_link', 'A link cannot stand inside another link.')
      } else {
        setAddress(token, href, headingIds)
      }
      open.push({ token, line, index, kept: href !== null && !nested })
    } else if (token.type === 'link_close') {
      closeLink(token, index, siblings, open.pop(), rendering)
    } else if (directiveOf(token)?.name === 'term') {
      // A glossary term becomes a link too.
      if (token.type === 'directive_open') open.push({ token, line, index, kept: true })
      else if (token.type === 'directive_close') open.pop()
    }
  })
}

function closeLink(
  close: Token,
  index: number,
  siblings: Token[],
  anchor: OpenAnchor | undefined,
  rendering: Rendering,
): void {
  if (anchor === undefined) return
  const empty = inlineText(siblings.slice(anchor.index + 1, index)).trim() === ''
  if (anchor.kept && empty) rendering.report(
    anchor.line,
    'empty_link',
    'A link needs words between its brackets.',
  )
  if (anchor.kept && !empty) return
  hide(anchor.token)
  hide(close)
}

/** The title is dropped: nothing may hide behind a hover. */
function setAddress(link: Token, href: string, headingIds: Set<string>): void {
  link.attrs = [['href', hrefOfHeading(href, headingIds)]]
  if (/^https?:/.test(href)) link.attrPush(['rel', OUTSIDE_REL])
}

/**
 * The address as it may stand in the page, read by the same rules as a browser's so that no spelling of
 * another scheme slips by; null when it must not be linked.
 */
function safeHref(href: string): string | null {
  if (href === '' || href.startsWith('?') || href.length > MAX_LENGTH || !URL.canParse(href, HERE.href)) return null
  const url = new URL(href, HERE)
  if (url.origin === HERE.origin) {
    // `https:guide` would be this site here and another one elsewhere; `//` would start another site's
    // address.
    if (/^[^/?#]*:/.test(href) || url.pathname.startsWith('//')) return null
    if (href.startsWith('#')) return url.hash === '' ? null : url.hash
    return url.pathname + url.search + url.hash
  }
  if (url.protocol === 'mailto:') return url.href
  const schemeWritten = /^https?:\/\//i.test(href)
  const anonymous = url.username === '' && url.password === ''
  return (url.protocol === 'https:' || url.protocol === 'http:') && schemeWritten && anonymous ? url.href : null
}

/** `#why-it-works` means the heading “Why it works”, whose id carries a prefix. */
function hrefOfHeading(href: string, headingIds: Set<string>): string {
  if (!href.startsWith('#')) return href
  const id = headingId(decodeURIComponentSafely(href.slice(1)))
  return headingIds.has(id) ? `#${id}` : href
}

function decodeURIComponentSafely(text: string): string {
  try {
    return decodeURIComponent(text)
  } catch {
    return text
  }
}
