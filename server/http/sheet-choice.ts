export { sheetChoice }

import { Router } from 'express'
import { safeNext } from '../people/safe-next.ts'

const YEAR = 365 * 24 * 60 * 60 * 1000

/** `POST /sheet`: pins the day or the night sheet, or follows the system again. */
function sheetChoice(options: { secure: boolean }): Router {
  const router = Router()
  router.post('/sheet', (req, res) => {
    const { sheet, next } = (req.body ?? {}) as Record<string, unknown>
    if (sheet === 'day' || sheet === 'night') {
      res.cookie('sheet', sheet, { maxAge: YEAR, sameSite: 'lax', httpOnly: true, secure: options.secure })
    } else {
      res.clearCookie('sheet')
    }
    res.redirect(303, safeNext(next))
  })
  return router
}
