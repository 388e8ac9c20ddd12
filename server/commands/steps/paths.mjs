export { root }

import path from 'node:path'
import { fileURLToPath } from 'node:url'

/** Folder of the clone. */
const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../../..')
