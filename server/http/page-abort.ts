export { forPage }

import { redirect, render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { isAppError } from '../errors.ts'

/**
 * Runs what a page needs and turns our errors into the error page (404, 403, ...); a visitor who has to sign in first is
 * sent there and comes back afterwards.
 */
async function forPage<T>(pageContext: PageContextServer, load: () => T | Promise<T>): Promise<T> {
  try {
    return await load()
  } catch (error) {
    if (!isAppError(error)) throw error
    if (error.status === 401) {
      throw redirect(`/sign-in?next=${encodeURIComponent(pageContext.urlOriginal)}`)
    }
    throw render(pageStatus(error.status), { message: error.message })
  }
}

function pageStatus(status: number): 403 | 404 | 429 | 503 {
  if (status === 403 || status === 429 || status === 503) return status
  return 404
}
