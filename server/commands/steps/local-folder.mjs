export { openLocalFolder }

import fs from 'node:fs'
import path from 'node:path'
import { CommandError } from './command-error.mjs'

/**
 * The folder for everything this clone makes for itself and Git does not know.
 * @returns {string} its path
 * @throws CommandError when a run as another user made it and this user may not write there
 */
function openLocalFolder(root) {
  const folder = path.join(root, '.local')
  try {
    fs.mkdirSync(folder, { recursive: true })
    fs.accessSync(folder, fs.constants.R_OK | fs.constants.W_OK | fs.constants.X_OK)
    return folder
  } catch (cause) {
    throw new CommandError(`This user may not write in ${folder}; was the command run as root before?`, {
      cause,
      advice: `Run it as root again, or take the folders over: sudo chown -R "$(id -un)" ${root}`,
    })
  }
}
