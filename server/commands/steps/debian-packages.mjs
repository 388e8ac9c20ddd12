export { installDebianPackages, missingPackages, installCommand }

import { spawnSync } from 'node:child_process'
import fs from 'node:fs'
import process from 'node:process'
import { runToEnd } from './child.mjs'
import { CommandError } from './command-error.mjs'
import { findChromium, findPostgres, OLDEST_POSTGRES } from './programs.mjs'
import { done, step } from './progress.mjs'

/**
 * Installs the Debian packages that this command needs and the machine lacks, when it may.
 * @param {{ postgres: boolean, chromium: boolean, chromiumPath?: string }} needs chromiumPath: CHROMIUM_PATH
 * @throws CommandError with the exact command to type when it may not
 */
async function installDebianPackages(life, needs) {
  if (needs.chromiumPath && findChromium({ given: needs.chromiumPath }) === null) {
    throw new CommandError(`CHROMIUM_PATH is ${needs.chromiumPath}, and that is no program.`, {
      advice: "Set it to the browser itself, or leave it out to have Debian's chromium installed and used.",
    })
  }
  const missing = missingPackages(needs)
  if (missing.length === 0) {
    done('Debian packages', 'nothing missing')
    return
  }
  const names = missing.join(' ')
  const rights = rightsToInstall()
  if (rights === null) {
    throw new CommandError(
      `Missing: ${names}. Installing needs root, and this user may not use sudo without a password.`,
      {
        advice: `Run this once, then run the command again:\n\n    ${installCommand(missing)}\n`,
      },
    )
  }
  await step('Debian packages', `installing ${names}`, () =>
    runToEnd(
      life,
      rights[0] ?? 'sh',
      [...rights.slice(1), ...(rights.length > 0 ? ['sh'] : []), '-c', installScript(missing)],
      {
        failure: `Installing ${names} did not work`,
        advice: `Try it by hand, then run the command again:\n\n    ${installCommand(missing)}\n`,
      },
    ),
  )
  const still = missingPackages(needs)
  if (still.length > 0) {
    throw new CommandError(`${still.join(' ')} was installed, but what is needed of it is not there.`, {
      advice: `PostgreSQL has to be version ${OLDEST_POSTGRES} or newer (Debian 12). Or set DATABASE_URL to use another server.`,
    })
  }
}

/** @returns {string[]} names of packages */
function missingPackages({ postgres, chromium, chromiumPath, root = '/' }) {
  return [
    ...(postgres && findPostgres({ root }) === null ? ['postgresql'] : []),
    ...(chromium && findChromium({ root, given: chromiumPath }) === null ? ['chromium'] : []),
  ]
}

/** The command for a person to type. */
function installCommand(packages) {
  return `sudo apt-get update && sudo apt-get install -y ${packages.join(' ')}`
}

/**
 * @returns {string[] | null} what to put before a command to run it as root; null when that is not possible
 */
function rightsToInstall() {
  if (!fs.existsSync('/usr/bin/apt-get')) {
    throw new CommandError('This set-up can install packages on Debian and its relatives only.', {
      advice: `Install PostgreSQL ${OLDEST_POSTGRES} or newer and run with DATABASE_URL; for tests set CHROMIUM_PATH too.`,
    })
  }
  if (process.getuid() === 0) return []
  const asked = spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' })
  return asked.status === 0 ? ['sudo', '-n'] : null
}

/**
 * Debian's package makes and starts a cluster of its own when it is installed. Nobody here needs it, and on a
 * machine without an init system it would be a process left behind; on a machine that has never had
 * PostgreSQL it is therefore asked not to, in the folder that Debian has for such wishes.
 */
function installScript(packages) {
  const wishes = '/etc/postgresql-common/createcluster.d'
  return [
    'set -e',
    'export DEBIAN_FRONTEND=noninteractive',
    `if [ ! -e /etc/postgresql-common/createcluster.conf ]; then mkdir -p ${wishes}`,
    `echo 'create_main_cluster = false' > ${wishes}/camber-and-clay.conf; fi`,
    'apt-get update',
    `apt-get install -y --no-install-recommends ${packages.join(' ')}`,
  ].join('\n')
}
