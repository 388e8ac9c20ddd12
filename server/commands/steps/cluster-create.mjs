export { createCluster, removeCluster, readAccess, writeAccess }

import { randomBytes } from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'
import { runToEnd } from './child.mjs'
import { CommandError } from './command-error.mjs'
import { clusterPaths } from './cluster-place.mjs'
import { databaseEnvironment } from './database-environment.mjs'

/**
 * Makes a cluster with data checksums and passwords of its own. It is made beside its place and moved there
 * when it is whole, so that an interrupted start leaves nothing half-made behind.
 * @param {import('./cluster-place.mjs').ClusterPlace} place
 * @param {{ bin: string, throwaway: boolean }} options
 */
async function createCluster(life, place, { bin, throwaway }) {
  const draft = clusterPaths(`${place.folder}.making`)
  removeCluster(draft)
  fs.mkdirSync(draft.folder, { recursive: true, mode: 0o700 })
  const access = { ownerPassword: newPassword(), appPassword: newPassword() }
  const passwordFile = path.join(draft.folder, 'password')
  fs.writeFileSync(passwordFile, access.ownerPassword, { mode: 0o600 })
  giveTo(place.user, draft.folder, passwordFile)
  await runToEnd(
    life,
    path.join(bin, 'initdb'),
    [
      `--pgdata=${draft.data}`,
      '--data-checksums',
      '--username=postgres',
      `--pwfile=${passwordFile}`,
      '--auth=scram-sha-256',
      '--encoding=UTF8',
      '--locale=C.UTF-8',
      ...(throwaway ? ['--no-sync'] : []),
    ],
    {
      ...asUser(place.user),
      cwd: draft.folder,
      env: databaseEnvironment(),
      failure: `Making a PostgreSQL cluster in ${place.folder} did not work`,
    },
  )
  fs.rmSync(passwordFile)
  writeAccess({ ...place, access: draft.access }, access)
  fs.renameSync(draft.folder, place.folder)
}

function removeCluster({ folder }) {
  fs.rmSync(folder, { recursive: true, force: true })
}

/** @returns {{ port?: number, ownerPassword: string, appPassword: string }} */
function readAccess(place) {
  try {
    return JSON.parse(fs.readFileSync(place.access, 'utf8'))
  } catch (cause) {
    throw new CommandError(`${place.access} holds the passwords of the database and cannot be read.`, {
      cause,
      advice: `Put it back from a backup, or begin with an empty database: rm -r ${place.folder}`,
    })
  }
}

function writeAccess(place, access) {
  const draft = `${place.access}.new`
  fs.writeFileSync(draft, JSON.stringify(access), { mode: 0o600 })
  giveTo(place.user, draft)
  fs.renameSync(draft, place.access)
}

/** Letters, digits, - and _ only, so that it needs no escaping in SQL and URLs. */
function newPassword() {
  return randomBytes(24).toString('base64url')
}

function giveTo(user, ...files) {
  if (user !== null) for (const file of files) fs.chownSync(file, user.uid, user.gid)
}

function asUser(user) {
  return user === null ? {} : { uid: user.uid, gid: user.gid }
}
