export { isPortFree, freePortFrom, randomFreePort, readPort }

import { randomInt } from 'node:crypto'
import net from 'node:net'
import { CommandError } from './command-error.mjs'

/**
 * Whether a server could listen on this port. Asked by listening on every address at once, which a program on
 * any one of them prevents.
 * @param {number} port
 * @returns {Promise<boolean>}
 * @throws CommandError for a port that this user may not use at all
 */
function isPortFree(port) {
  return new Promise((resolve, reject) => {
    const probe = net.createServer()
    probe.once('error', (error) => {
      if (error.code === 'EADDRINUSE') resolve(false)
      else if (error.code === 'EACCES') {
        reject(
          new CommandError(`Port ${port} may only be used by root.`, {
            advice: 'Choose one from 1024 up: PORT=3000 npm start',
          }),
        )
      } else reject(error)
    })
    probe.listen({ port, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/** The first free port from `first` up. */
async function freePortFrom(first, isFree = isPortFree) {
  for (let port = first; port <= 65_535; port += 1) if (await isFree(port)) return port
  throw new CommandError(`No port from ${first} up is free.`)
}

/**
 * A free port in 54000 to 54999; random, so that two clones that start at the same moment rarely choose the
 * same.
 */
async function randomFreePort(isFree = isPortFree) {
  for (let tries = 0; tries < 200; tries += 1) {
    const port = randomInt(54_000, 55_000)
    if (await isFree(port)) return port
  }
  throw new CommandError('No port between 54000 and 54999 is free for PostgreSQL.')
}

/**
 * Reads PORT as a person gave it.
 * @param {string | undefined} text
 * @returns {number | undefined} undefined when none was given
 */
function readPort(text) {
  if (text === undefined || text.trim() === '') return undefined
  const port = Number(text)
  if (!/^\d+$/.test(text.trim()) || port < 1 || port > 65_535) {
    throw new CommandError(`PORT is "${text}", which is no port.`, {
      advice: 'Give a whole number from 1 to 65535: PORT=3000 npm start',
    })
  }
  return port
}
