export { checkNode, isNewEnough }

import process from 'node:process'
import { CommandError } from './command-error.mjs'
import { done } from './progress.mjs'

const OLDEST = [20, 19]

/** @throws CommandError when this Node.js is older than what the packages need */
function checkNode(version = process.versions.node) {
  if (!isNewEnough(version)) {
    throw new CommandError(`Node.js ${version} is too old: version ${OLDEST.join('.')} or newer is needed.`, {
      advice: 'Install Node.js 20 (https://nodejs.org) and run the command again.',
    })
  }
  done('Node.js', version)
}

/** @param {string} version such as "20.19.0" */
function isNewEnough(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number)
  return major > OLDEST[0] || (major === OLDEST[0] && minor >= OLDEST[1])
}
