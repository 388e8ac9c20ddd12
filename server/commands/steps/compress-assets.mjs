export { compressAssets }

import fs from 'node:fs'
import path from 'node:path'
import { brotliCompressSync, constants, gzipSync } from 'node:zlib'

const WORTH_IT = /\.(js|css|svg|json)$/

/**
 * Puts a .br and a .gz beside every built text file, compressed once as hard as it goes instead of at every request. After the
 * whole build rather than as a plug-in, because Vike moves stylesheets to their place when Vite is done.
 */
function compressAssets(root) {
  const built = path.join(root, 'dist/client')
  for (const entry of fs.readdirSync(built, { recursive: true, withFileTypes: true })) {
    if (!entry.isFile() || !WORTH_IT.test(entry.name)) continue
    const file = path.join(entry.parentPath ?? entry.path, entry.name)
    const content = fs.readFileSync(file)
    fs.writeFileSync(`${file}.gz`, gzipSync(content, { level: 9 }))
    fs.writeFileSync(`${file}.br`, brotliCompressSync(content, { params: { [constants.BROTLI_PARAM_QUALITY]: 11 } }))
  }
}
