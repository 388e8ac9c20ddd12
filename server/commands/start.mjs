// `npm start`: all the set-up, then the product, until Ctrl-C. Needs nothing but Node.js: it runs before `npm
// ci`.

import process from 'node:process'
import { exitWords } from './steps/child.mjs'
import { CommandError } from './steps/command-error.mjs'
import { runCommand } from './steps/lifetime.mjs'
import { root } from './steps/paths.mjs'
import { prepareToServe } from './steps/prepare-to-serve.mjs'
import { done, line } from './steps/progress.mjs'
import { addressOf, startServer, stopServer, waitUntilHealthy } from './steps/server-process.mjs'

await runCommand(async (life) => {
  const { env, where, tellAddress } = await prepareToServe(life, root, {
    command: 'npm start',
    build: true,
    mode: 'production',
  })
  done('Server', `starting on port ${where.port}`)
  const server = startServer(life, root, env)
  life.atEnd(() => stopServer(server))
  await waitUntilHealthy(server, where)
  life.exitCodeOnSignal = 0
  const address = addressOf(where, process.env.ORIGIN)
  tellAddress({ address })
  line(`\nCamber & Clay is ready at ${address}   (Ctrl-C stops it)`)

  const end = await server.ended
  throw new CommandError(`The server ended by itself (${exitWords(end)}); its own words are above.`, {
    exitCode: end.code || 1,
  })
})
