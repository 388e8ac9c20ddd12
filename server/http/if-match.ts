export { sendVersion, versionFromIfMatch }

import type { Request, Response } from 'express'
import { PreconditionRequiredError } from '../errors.ts'

/** Stands for a tag that matches nothing; real versions begin at 1. */
const NO_VERSION = -1

/**
 * The version that a request was made for, from `If-Match` (RFC 9110, section 13.1.1: strong comparison, so a weak tag
 * matches nothing). Of several tags, the one that is current counts.
 * @throws PreconditionRequiredError (428) without the header, and for `*`: what is decided on must be named
 */
function versionFromIfMatch(req: Request, current: number): number {
  const header = req.get('if-match')?.trim()
  if (header === undefined || header === '' || header === '*') {
    throw new PreconditionRequiredError('Say which version you mean: send If-Match with the ETag you were given.')
  }
  const tags = header.split(',').map((tag) => /^"(\d{1,9})"$/.exec(tag.trim())?.[1])
  const versions = tags.flatMap((tag) => (tag === undefined ? [] : [Number(tag)]))
  return versions.find((version) => version === current) ?? versions[0] ?? NO_VERSION
}

/** Names the version that is answered with, as the ETag. */
function sendVersion(res: Response, { version }: { version: number }): void {
  res.setHeader('ETag', `"${version}"`)
}
