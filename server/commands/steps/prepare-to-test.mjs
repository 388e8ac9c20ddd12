export { prepareToTest }

import process from 'node:process'
import { buildPages } from './build-pages.mjs'
import { checkNode } from './check-node.mjs'
import { beAlone, oneSetUpAtATime } from './command-lock.mjs'
import { databaseEnvironment } from './database-environment.mjs'
import { installDebianPackages } from './debian-packages.mjs'
import { openLocalFolder } from './local-folder.mjs'
import { installNpmPackages } from './npm-packages.mjs'
import { startOwnPostgres } from './own-postgres.mjs'
import { findChromium } from './programs.mjs'

/**
 * Everything the tests need, none of it shared with an `npm start` that runs in the same clone: a throwaway
 * PostgreSQL of their own (or, with DATABASE_URL, databases of their own on that server), a browser, the
 * built pages.
 * @param {string} root folder of the clone
 * @returns {Promise<{ env: Record<string, string>, localFolder: string }>}
 */
async function prepareToTest(life, root) {
  const givenDatabase = process.env.DATABASE_URL || undefined
  const chromiumPath = process.env.CHROMIUM_PATH || undefined
  checkNode()
  const localFolder = openLocalFolder(root)
  await beAlone(life, localFolder, { kind: 'test', command: 'npm test' })
  await oneSetUpAtATime(life, localFolder, async () => {
    await installDebianPackages(life, { postgres: givenDatabase === undefined, chromium: true, chromiumPath })
    await installNpmPackages(life, root)
    await buildPages(life, root)
  })
  const databaseUrl =
    givenDatabase ??
    (await startOwnPostgres(life, root, { name: 'test-postgres', database: 'tests', throwaway: true }))
  const env = givenDatabase === undefined ? databaseEnvironment() : { ...process.env }
  // The tests choose these for each server they start; what the person's shell says must not reach them.
  for (const name of ['DATABASE_URL', 'PORT', 'HOST', 'ORIGIN', 'NODE_ENV', 'APP_MODE']) delete env[name]
  return {
    env: { ...env, TEST_DATABASE_URL: databaseUrl, CHROMIUM_PATH: findChromium({ given: chromiumPath }) },
    localFolder,
  }
}
