export { prepareToServe }

import process from 'node:process'
import { buildPages } from './build-pages.mjs'
import { checkNode } from './check-node.mjs'
import { choosePort } from './choose-port.mjs'
import { beAlone, oneSetUpAtATime } from './command-lock.mjs'
import { databaseEnvironment } from './database-environment.mjs'
import { migrate, seed } from './database-scripts.mjs'
import { installDebianPackages } from './debian-packages.mjs'
import { openLocalFolder } from './local-folder.mjs'
import { installNpmPackages } from './npm-packages.mjs'
import { startOwnPostgres } from './own-postgres.mjs'

/**
 * Everything that has to be there before the server can start. Safe to repeat: each step looks first whether
 * it has something to do.
 * @param {string} root folder of the clone
 * @param {{ command: string, build: boolean, mode: 'production' | 'development' }} options mode: what Node.js
 *   and Vite call NODE_ENV
 * @returns {Promise<{ env: Record<string, string>, where: { host: string, port: number }, tellAddress:
 *   (facts: object) => void }>}
 */
async function prepareToServe(life, root, { command, build, mode }) {
  const givenDatabase = process.env.DATABASE_URL || undefined
  checkNode()
  const localFolder = openLocalFolder(root)
  const tellAddress = await beAlone(life, localFolder, { kind: 'start', command })
  // Before the long steps: a port that cannot be had should not be found out after minutes.
  const port = await choosePort(process.env.PORT)
  await oneSetUpAtATime(life, localFolder, async () => {
    await installDebianPackages(life, { postgres: givenDatabase === undefined, chromium: false })
    await installNpmPackages(life, root)
    if (build) await buildPages(life, root)
  })
  const databaseUrl =
    givenDatabase ?? (await startOwnPostgres(life, root, { name: 'postgres', database: 'camber_and_clay' }))
  await migrate(life, root, databaseUrl)
  await seed(life, root, databaseUrl)
  const base = givenDatabase === undefined ? databaseEnvironment({ DATABASE_URL: databaseUrl }) : process.env
  return {
    env: { ...base, PORT: String(port), NODE_ENV: mode },
    where: { host: process.env.HOST || '127.0.0.1', port },
    tellAddress,
  }
}
