export { discovery }

import { Router } from 'express'
import type { App } from '../context.ts'
import { listSitemapEntries } from '../guides/index.ts'

/** `/robots.txt` and `/sitemap.xml`; absolute addresses come from the configuration, never from the request. */
function discovery(app: App): Router {
  const router = Router()
  router.get('/robots.txt', (_req, res) => {
    res
      .type('text/plain')
      .set('Cache-Control', 'public, max-age=3600')
      .send(
        [
          'User-agent: *',
          ...['/api/', '/write', '/review', '/you', '/members', '/sign-in', '/join', '/forgotten', '/mailbox'].map(
            (path) => `Disallow: ${path}`,
          ),
          `Sitemap: ${app.config.origin}/sitemap.xml`,
          '',
        ].join('\n'),
      )
  })
  router.get('/sitemap.xml', async (req, res) => {
    const entries = await listSitemapEntries(req.ctx)
    const urls = entries.map(
      ({ path, changedAt }) =>
        `  <url><loc>${app.config.origin}${path}</loc>` +
        `${changedAt === null ? '' : `<lastmod>${changedAt.toISOString()}</lastmod>`}</url>`,
    )
    res
      .type('application/xml')
      .set('Cache-Control', 'public, max-age=300')
      .send(
        `<?xml version="1.0" encoding="UTF-8"?>\n<urlset xmlns="http://www.sitemaps.org/schemas/sitemap/0.9">\n${urls.join('\n')}\n</urlset>\n`,
      )
  })
  return router
}
