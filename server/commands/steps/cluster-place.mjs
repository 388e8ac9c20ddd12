export { chooseClusterPlace, clusterPaths }

import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { CommandError } from './command-error.mjs'

/**
 * @typedef {{ name: string, uid: number, gid: number }} User
 * @typedef {object} ClusterPlace
 * @property {string} folder everything of the cluster; removing it removes the cluster
 * @property {string} data PostgreSQL's data folder
 * @property {string} access file with port and passwords, readable by its owner only
 * @property {string} log
 * @property {User | null} user who runs PostgreSQL; null: whoever runs this command
 */

/**
 * Where the cluster lies and who runs it. PostgreSQL refuses to run as root, so for root it is Debian's user
 * `postgres` (or the owner of a cluster that exists). That user cannot enter a clone below root's home; the
 * cluster of such a clone lies under /var/lib instead.
 * @param {string} root folder of the clone
 * @param {string} name "postgres" or "test-postgres"
 * @returns {ClusterPlace}
 */
function chooseClusterPlace(root, name) {
  const inClone = path.join(root, '.local', name)
  if (process.getuid() !== 0) {
    assertOwn(inClone)
    return { ...clusterPaths(inClone), user: null }
  }
  const elsewhere = path.join('/var/lib/camber-and-clay', folderMark(root), name)
  const existing = [inClone, elsewhere].find((folder) => fs.existsSync(folder))
  const user = (existing && ownerOf(existing)) ?? userNamed('postgres')
  const folder = existing ?? (canEnter(user, root) ? inClone : elsewhere)
  makePassable(path.dirname(folder))
  return { ...clusterPaths(folder), user }
}

function clusterPaths(folder) {
  return {
    folder,
    data: path.join(folder, 'data'),
    access: path.join(folder, 'access.json'),
    log: path.join(folder, 'server.log'),
  }
}

function assertOwn(folder) {
  const owner = fs.existsSync(folder) ? fs.statSync(folder).uid : process.getuid()
  if (owner === process.getuid()) return
  throw new CommandError(
    `The database in ${folder} belongs to another user (number ${owner}); a run as root makes it so.`,
    {
      advice: `Run the command as before, or take the database over: sudo chown -R "$(id -un)" ${folder}`,
    },
  )
}

/** Short and the same for the same clone, so that a second start finds its data again. */
function folderMark(root) {
  return createHash('sha256').update(fs.realpathSync(root)).digest('hex').slice(0, 12)
}

/** @returns {User | null} null for root, who may not run PostgreSQL */
function ownerOf(folder) {
  const { uid, gid } = fs.statSync(folder)
  return uid === 0
    ? null
    : { name: users().find((user) => user.uid === uid)?.name ?? `user ${uid}`, uid, gid }
}

/** @returns {User} */
function userNamed(name) {
  const user = users().find((one) => one.name === name)
  if (user !== undefined) return user
  throw new CommandError(`PostgreSQL may not run as root, and there is no user "${name}" to run it.`, {
    advice:
      "Install Debian's package postgresql, which makes that user, or run the command as an ordinary user.",
  })
}

/** @returns {User[]} everyone in /etc/passwd */
function users() {
  const rows = fs
    .readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .filter((row) => row !== '')
  return rows
    .map((row) => row.split(':'))
    .map(([name, , uid, gid]) => ({ name, uid: Number(uid), gid: Number(gid) }))
}

function canEnter({ uid, gid }, folder) {
  return spawnSync('/usr/bin/test', ['-x', folder], { uid, gid, cwd: '/' }).status === 0
}

/**
 * Makes the folder, and lets others through it whatever root's umask is; what lies inside is closed by
 * itself.
 */
function makePassable(folder) {
  fs.mkdirSync(folder, { recursive: true })
  for (const part of [path.dirname(folder), folder]) {
    const isOurs = part.endsWith('/.local') || part.startsWith('/var/lib/camber-and-clay')
    if (isOurs) fs.chmodSync(part, 0o755)
  }
}
