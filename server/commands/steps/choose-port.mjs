export { choosePort }

import { CommandError } from './command-error.mjs'
import { done } from './progress.mjs'
import { freePortFrom, isPortFree, readPort } from './ports.mjs'

const USUAL_PORT = 3000

/**
 * The port to serve on: the one given, or the first free one from 3000 up.
 * @param {string | undefined} given PORT
 * @throws CommandError when the given one is no port or in use
 */
async function choosePort(given, isFree = isPortFree) {
  const port = readPort(given)
  if (port === undefined) {
    const free = await freePortFrom(USUAL_PORT, isFree)
    if (free !== USUAL_PORT) done('Port', `${USUAL_PORT} is in use by another program; taking ${free}`)
    return free
  }
  if (await isFree(port)) return port
  throw new CommandError(`Port ${port} is in use by another program.`, {
    advice: 'Give another one, or leave PORT out to have a free one chosen: PORT=3001 npm start',
  })
}
