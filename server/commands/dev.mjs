// `npm run dev`: as `npm start`, with live reload of the pages and a new server on every change of its code.

import path from 'node:path'
import process from 'node:process'
import { setTimeout as pause } from 'node:timers/promises'
import { exitWords } from './steps/child.mjs'
import { runCommand } from './steps/lifetime.mjs'
import { root } from './steps/paths.mjs'
import { prepareToServe } from './steps/prepare-to-serve.mjs'
import { line } from './steps/progress.mjs'
import { addressOf, startServer, stopServer, waitUntilHealthy } from './steps/server-process.mjs'
import { watchFolders } from './steps/watch-folders.mjs'

// Saving several files at once, or a checkout, should make one restart and not ten.
const SETTLING_TIME = 150

await runCommand(async (life) => {
  const { env, where, tellAddress } = await prepareToServe(life, root, {
    command: 'npm run dev',
    build: false,
    mode: 'development',
  })
  const address = addressOf(where, process.env.ORIGIN)
  life.exitCodeOnSignal = 0
  tellAddress({ address })

  let server
  life.atEnd(() => server && stopServer(server))
  const changes = changesOf(
    ['server', 'shared'].map((folder) => path.join(root, folder)),
    life,
  )
  for (;;) {
    line(`• Server: starting on port ${where.port}`)
    server = startServer(life, root, env)
    const isWanted = announce(server)
    const file = await changes.next()
    isWanted.no()
    line(`\n• ${path.relative(root, file)} changed: starting the server again`)
    await stopServer(server)
  }

  /** Says that the server is ready, or that it ended; a mistake in the code is mended by the next change. */
  function announce(current) {
    let wanted = true
    const say = (text) => wanted && !life.ending && line(text)
    waitUntilHealthy(current, where).then(
      () => {
        say(`\nCamber & Clay is ready at ${address}   (Ctrl-C stops it)`)
        void current.ended.then((end) =>
          say(`\nThe server ended (${exitWords(end)}). It starts again when a file changes.`),
        )
      },
      (error) => say(`\n${error.message} It starts again when a file changes.`),
    )
    return { no: () => (wanted = false) }
  }
})

/** Changes of code, one at a time, each after things have settled. */
function changesOf(folders, life) {
  let latest
  let wake = () => {}
  const stop = watchFolders(folders, (file) => {
    if (!/\.(ts|mts|js|json|vue)$/.test(file) || file.endsWith('.test.ts')) return
    latest = file
    wake()
  })
  life.atEnd(stop)
  return {
    async next() {
      if (latest === undefined) await new Promise((resolve) => (wake = resolve))
      await pause(SETTLING_TIME)
      const file = latest
      latest = undefined
      return file
    },
  }
}
