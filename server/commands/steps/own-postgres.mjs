export { startOwnPostgres }

import fs from 'node:fs'
import path from 'node:path'
import { CommandError } from './command-error.mjs'
import { createCluster, removeCluster } from './cluster-create.mjs'
import { chooseClusterPlace } from './cluster-place.mjs'
import { clearAfterCrash } from './cluster-recover.mjs'
import { runCluster } from './cluster-run.mjs'
import { openDatabase } from './database-access.mjs'
import { findPostgres } from './programs.mjs'
import { done, step } from './progress.mjs'

// Tests kill programs, never the machine. Without fsync the data outlives every killed process just the same
// (it is in the kernel's hands) and only a power cut could tear it; a cluster that is thrown away afterwards
// need not fear that.
const THROWAWAY_SETTINGS = { fsync: 'off', full_page_writes: 'off', max_connections: '200' }

/**
 * Brings up this clone's own PostgreSQL and its database.
 * @param {string} root
 * @param {{ name: string, database: string, throwaway?: boolean }} options
 *   throwaway: a new cluster each time, removed at the end, whose role may create databases
 * @returns {Promise<string>} URL of the database
 */
async function startOwnPostgres(life, root, { name, database, throwaway = false }) {
  const place = chooseClusterPlace(root, name)
  if (throwaway) {
    await clearAfterCrash(place.data)
    removeCluster(place)
    life.atEnd(() => removeCluster(place))
  }
  const { bin } = programsFor(place)
  if (!fs.existsSync(place.folder)) {
    await step('PostgreSQL', `making a cluster in ${place.folder}`, () =>
      createCluster(life, place, { bin, throwaway }),
    )
  }
  if (await clearAfterCrash(place.data))
    done('PostgreSQL', 'an earlier run did not end cleanly; recovering its data')
  return step(
    'PostgreSQL',
    `starting on 127.0.0.1${place.user ? ` as ${place.user.name}` : ''}`,
    async () => {
      const { port, access } = await runCluster(life, place, {
        bin,
        settings: throwaway ? THROWAWAY_SETTINGS : {},
      })
      return openDatabase(life, { bin, port, access, name: database, mayCreateDatabases: throwaway })
    },
    (url) => `ready on port ${new URL(url).port}`,
  )
}

/** A cluster can be run only by the version that made it; a new one is made by the newest. */
function programsFor(place) {
  const made = path.join(place.data, 'PG_VERSION')
  const version = fs.existsSync(made) ? Number(fs.readFileSync(made, 'utf8')) : undefined
  const programs = findPostgres({ version })
  if (programs !== null) return programs
  throw new CommandError(
    `The database in ${place.folder} was made by PostgreSQL ${version}, which is not installed any more.`,
    {
      advice: `Install it (sudo apt-get install -y postgresql-${version}) and take a dump before moving to a newer one.`,
    },
  )
}
