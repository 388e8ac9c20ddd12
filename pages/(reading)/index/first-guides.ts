export { firstGuides }

/** Where who is new begins, in this order: safe habits, the corner, and the change that everybody asks about. */
const order = ['lithium-battery-care', 'droop', 'diff-fluids']

/** Three guides for who is new: those named here that the book has, made up to three with the first ones of the book. */
function firstGuides<T extends { slug: string }>(guides: readonly T[]): T[] {
  const named = order.flatMap((slug) => guides.find((guide) => guide.slug === slug) ?? [])
  const others = guides.filter((guide) => !named.includes(guide))
  return [...named, ...others].slice(0, 3)
}
