export { articleData, jsonForScript }

/** What search engines and readers' tools may know of a guide: schema.org/Article. */
function articleData(
  guide: {
    slug: string
    mark: string
    title: string
    inShort: string
    chapter: { name: string }
    edition: number
    contributors: readonly { name: string }[]
    approver: { name: string }
    firstPublishedAt: string
    publishedAt: string
  },
  { origin, club }: { origin: string; club: string },
): Record<string, unknown> {
  const url = `${origin}/guides/${guide.slug}`
  return {
    '@context': 'https://schema.org',
    '@type': 'Article',
    '@id': url,
    url,
    mainEntityOfPage: url,
    headline: guide.title,
    identifier: guide.mark,
    description: guide.inShort,
    articleSection: guide.chapter.name,
    inLanguage: 'en-GB',
    version: guide.edition,
    author: guide.contributors.map(({ name }) => ({ '@type': 'Person', name })),
    editor: { '@type': 'Person', name: guide.approver.name },
    publisher: { '@type': 'Organization', name: club, url: origin },
    datePublished: guide.firstPublishedAt,
    dateModified: guide.publishedAt,
  }
}

/**
 * JSON that may stand inside a script element: nothing in it can end the element or begin a comment, and the two line
 * separators that older scripts stumble over are written out.
 */
function jsonForScript(value: unknown): string {
  return JSON.stringify(value).replace(/[<>&\u2028\u2029]/g, (sign) => `\\u${sign.charCodeAt(0).toString(16).padStart(4, '0')}`)
}
