export { safeNext }

// Only for resolving; a `next` that stays on this origin stays on ours.
const BASE = 'http://base.invalid'

/**
 * Where to go after signing in: a path of this site, or `/` for everything else.
 *
 * Browsers read `//host`, `/\host` and both with tabs or line breaks in between as another host. So the text has to be
 * a path in plain printable characters to begin with, and what the URL standard makes of it has to stay on the origin.
 */
function safeNext(next: unknown): string {
  if (typeof next !== 'string' || next.length > 500) return '/'
  if (!/^\/(?![/\\])[\x21-\x5b\x5d-\x7e]*$/.test(next)) return '/'
  // A server in between might decode once more before it redirects.
  if (/^\/(?:%2f|%5c|%09|%0a|%0d|\.{1,2}(?:\/|%2f))/i.test(next)) return '/'
  if (!URL.canParse(next, BASE)) return '/'
  const url = new URL(next, BASE)
  if (url.origin !== BASE || url.pathname.startsWith('//')) return '/'
  return `${url.pathname}${url.search}${url.hash}`
}
