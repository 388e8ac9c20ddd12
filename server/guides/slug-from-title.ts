export { slugFromTitle, nextFreeSlug }

const LONGEST = 80

/** An address made from a title: plain ASCII letters, digits and single hyphens; `guide` when nothing of it is left. */
function slugFromTitle(title: string): string {
  const words = title
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .replace(/[’']/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
  const short = words.length <= LONGEST ? words : words.slice(0, LONGEST + 1).replace(/-[^-]*$/, '').slice(0, LONGEST)
  return short === '' ? 'guide' : short
}

/** `slug`, or `slug-2`, `slug-3` and so on: the first that is not taken. */
function nextFreeSlug(slug: string, taken: ReadonlySet<string>): string {
  let candidate = slug
  for (let n = 2; taken.has(candidate); n++) candidate = `${slug}-${n}`
  return candidate
}
