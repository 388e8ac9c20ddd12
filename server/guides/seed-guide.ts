export { seedGuide }

import { eq } from 'drizzle-orm'
import type { App } from '../context.ts'
import { guides } from '../db/schema/index.ts'
import type { GuideContent } from '#shared/schemas/guide-content.ts'
import { createGuide } from './create-guide.ts'
import { publishEdition } from './publish-edition.ts'

interface FirstGuide {
  slug: string
  chapter: string
  number: number
  content: GuideContent
  authorId: string
  approverId: string
  summary?: string
  publishedAt?: Date
}

/**
 * Publishes the first edition of a guide of the book that a new installation starts with. Does nothing when there is a
 * guide with that slug already.
 * @throws Error that names what is wrong with the body: stock with problems in it must not go out
 */
async function seedGuide(
  app: Pick<App, 'db' | 'renderer'>,
  guide: FirstGuide,
): Promise<{ slug: string; created: boolean }> {
  const { slug, chapter, number, content, authorId, approverId, summary = 'First edition', publishedAt } = guide
  const [known] = await app.db.select({ id: guides.id }).from(guides).where(eq(guides.slug, slug))
  if (known !== undefined) return { slug, created: false }
  const rendering = await app.renderer.render(content.body, { urgent: true })
  if (rendering.problems.length > 0) {
    const lines = rendering.problems.map((problem) => `  line ${problem.line}: ${problem.message}`)
    throw new Error(`The guide “${slug}” cannot be published:\n${lines.join('\n')}`)
  }
  await app.db.transaction(async (tx) => {
    const { guideId } = await createGuide(tx, { chapter, number, slug, title: content.title })
    await publishEdition(tx, {
      guideId, content, rendering, authorId, approverId, editId: null, summary,
      ...(publishedAt === undefined ? {} : { publishedAt }),
    })
  })
  return { slug, created: true }
}
