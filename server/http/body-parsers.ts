export { formBodies, jsonBodies }

import express, { type RequestHandler } from 'express'
import { AppError } from '../errors.ts'

// A guide body of 64 KiB can be six times as long once every character is escaped in JSON.
const JSON_LIMIT = '640kb'
const FORM_LIMIT = '640kb'

/** JSON and nothing else: a form or plain text that another site posts is refused before anything reads it. */
function jsonBodies(): RequestHandler[] {
  return [
    (req, _res, next) => {
      const hasBody = req.headers['content-length'] !== undefined && req.headers['content-length'] !== '0'
      if ((hasBody || req.headers['transfer-encoding'] !== undefined) && !req.is('application/json')) {
        throw new AppError('not_json', 415, 'Send the body as application/json.')
      }
      next()
    },
    express.json({ limit: JSON_LIMIT, strict: true }),
  ]
}

/** The fields of a posted HTML form, flat: names such as `effects.0.phase` are taken apart by the capability. */
function formBodies(): RequestHandler {
  return express.urlencoded({ extended: false, limit: FORM_LIMIT, parameterLimit: 2_000 })
}
