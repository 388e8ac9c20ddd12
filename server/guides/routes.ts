export { GuidesQuery, guidesApi }

import { Router } from 'express'
import { z } from 'zod'
import type { App } from '../context.ts'
import { listAdjustables } from '../effects/index.ts'
import { pageNumber } from '../http/page-number.ts'
import { parseInput } from '../people/parse-input.ts'
import { getGlossary } from './get-glossary.ts'
import { getGuide } from './get-guide.ts'
import { listChapters } from './list-chapters.ts'
import { listGuides } from './list-guides.ts'

const GuidesQuery = z.strictObject({
  chapter: z.string().regex(/^[A-Z]$/, { error: 'Chapter: one capital letter, such as B.' }).optional(),
  page: pageNumber.default(1),
})

/** Reading: guides, chapters, glossary, adjustables. */
function guidesApi(_app: App): Router {
  const router = Router()
  router.get('/guides', async (req, res) => {
    const { chapter, page } = parseInput(GuidesQuery, req.query)
    const list = await listGuides(req.ctx, { page, ...(chapter === undefined ? {} : { chapter }) })
    const address = (to: number) => `/api/guides?${chapter === undefined ? '' : `chapter=${chapter}&`}page=${to}`
    res.links({
      ...(page > 1 ? { prev: address(page - 1) } : {}),
      ...(page < list.pages ? { next: address(page + 1) } : {}),
    })
    res.setHeader('X-Total-Count', String(list.total))
    res.json(list.guides)
  })
  router.get('/guides/:slug', async (req, res) => {
    const guide = await getGuide(req.ctx, req.params.slug)
    if ('movedTo' in guide) {
      res.redirect(301, `/api/guides/${guide.movedTo}`)
      return
    }
    res.json(guide)
  })
  router.get('/chapters', async (req, res) => {
    res.json(await listChapters(req.ctx))
  })
  router.get('/glossary', async (req, res) => {
    res.json(await getGlossary(req.ctx))
  })
  router.get('/adjustables', async (req, res) => {
    res.json(await listAdjustables(req.ctx))
  })
  return router
}
