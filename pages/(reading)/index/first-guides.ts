export { firstGuides }

/** Where who is new begins, and why there: safe habits, the change that is soonest felt, the one that everybody asks about. */
const order = [
  { slug: 'lithium-battery-care', why: 'First: charge it safely' },
  { slug: 'droop', why: 'Next: quick to try' },
  { slug: 'diff-fluids', why: 'Then: the usual question' },
]

/** Three guides for who is new: those named here that the book has, made up to three with the first ones of the book. */
function firstGuides<T extends { slug: string }>(guides: readonly T[]): (T & { why: string })[] {
  const named = order.flatMap(({ slug, why }) => guides.filter((guide) => guide.slug === slug).map((guide) => ({ ...guide, why })))
  const others = guides.filter(({ slug }) => named.every((guide) => guide.slug !== slug)).map((guide) => ({ ...guide, why: '' }))
  return [...named, ...others].slice(0, 3)
}
