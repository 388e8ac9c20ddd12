export { installNpmPackages, differsFromLock }

import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { runToEnd } from './child.mjs'
import { done, step } from './progress.mjs'

/** Runs `npm ci` when package-lock.json asks for something else than what is installed. */
async function installNpmPackages(life, root) {
  if (
    !differsFromLock(readJson(root, 'package-lock.json'), readJson(root, 'node_modules/.package-lock.json'))
  ) {
    done('npm packages', 'up to date')
    return
  }
  const [program, ...before] = npmCommand()
  // Building and testing need the development packages, whatever NODE_ENV says about running.
  const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund']
  await step('npm packages', 'installing', () =>
    runToEnd(life, program, args, {
      cwd: root,
      failure: '`npm ci` did not work',
      advice: 'Is this machine connected to the npm registry?',
    }),
  )
}

/**
 * Compares what the lock file asks for with npm's own note of what is installed. Times of files would not do:
 * a copy or a checkout changes them, and npm itself may write the lock file last.
 * @param {object | null} wanted package-lock.json
 * @param {object | null} installed node_modules/.package-lock.json, which npm writes when it has finished
 */
function differsFromLock(wanted, installed) {
  if (wanted === null) return false
  if (installed === null) return true
  return Object.entries(wanted.packages).some(
    ([place, { version, integrity, link, optional, devOptional, peer }]) => {
      if (place === '' || link) return false
      const present = installed.packages[place]
      // Packages for other processors and systems are in every lock file and installed nowhere but there.
      if (present === undefined) return !(optional || devOptional || peer)
      return present.version !== version || present.integrity !== integrity
    },
  )
}

/** The npm that started this command, else the one in PATH. */
function npmCommand() {
  const npm = process.env.npm_execpath ?? ''
  return path.basename(npm) === 'npm-cli.js' ? [process.execPath, npm] : ['npm']
}

function readJson(root, file) {
  try {
    return JSON.parse(fs.readFileSync(path.join(root, file), 'utf8'))
  } catch {
    return null
  }
}
