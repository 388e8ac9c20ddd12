export { buildPages, fingerprint }

import { createHash } from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { runToEnd } from './child.mjs'
import { compressAssets } from './compress-assets.mjs'
import { done, step } from './progress.mjs'

// Pages load data through the server's own modules, so these are part of the build too.
const FOLDERS = ['pages', 'renderer', 'server', 'shared']
const FILES = ['package.json', 'package-lock.json', 'tsconfig.json', 'vite.config.ts', 'tailwind.config.ts']
const NO_PART_OF_THE_BUILD = /\.test\.\w+$|\.md$|^server\/commands\//

/** Builds the pages into dist/ when something they are made of has changed since the last finished build. */
async function buildPages(life, root) {
  const stamp = path.join(root, 'dist/.build-stamp')
  const now = fingerprint(root)
  if (readText(stamp) === now) {
    done('Pages', 'build is up to date')
    return
  }
  // Without the stamp first, a build that is interrupted would pass for a finished one.
  fs.rmSync(stamp, { force: true })
  const vite = path.join(root, 'node_modules/vite/bin/vite.js')
  await step('Pages', 'building', () =>
    runToEnd(life, process.execPath, [vite, 'build'], {
      cwd: root,
      env: { ...process.env, NODE_ENV: 'production' },
      failure: 'Building the pages did not work',
    }),
  )
  compressAssets(root)
  fs.writeFileSync(stamp, now)
}

/** One hash over the names and contents of everything that goes into the build. */
function fingerprint(root) {
  const hash = createHash('sha256')
  for (const file of [...FILES, ...FOLDERS.flatMap((folder) => filesUnder(root, folder))]) {
    const content = readBytes(path.join(root, file))
    if (content !== null) hash.update(`${file}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}

/** Files below a folder as paths from root, in one order on every machine. */
function filesUnder(root, folder) {
  if (!fs.existsSync(path.join(root, folder))) return []
  return fs
    .readdirSync(path.join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(root, path.join(entry.parentPath ?? entry.path, entry.name)))
    .filter((file) => !NO_PART_OF_THE_BUILD.test(file))
    .sort()
}

function readBytes(file) {
  try {
    return fs.readFileSync(file)
  } catch (error) {
    // A file that is gone or is no file at all is no input; anything else (no right to read) has to be seen.
    if (error.code === 'ENOENT') return null
    throw error
  }
}

function readText(file) {
  return readBytes(file)?.toString('utf8') ?? ''
}
