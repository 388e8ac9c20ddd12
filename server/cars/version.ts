export { requireVersion }

import { PreconditionFailedError } from '../errors.ts'
import type { CarRow } from './car-rows.ts'

/** @throws PreconditionFailedError (412), with the version it has now */
function requireVersion(row: CarRow, version: number): CarRow {
  if (row.version === version) return row
  throw new PreconditionFailedError('This car was changed in another tab or on another device. Look at it again before you save over it.', {
    version: row.version,
  })
}
