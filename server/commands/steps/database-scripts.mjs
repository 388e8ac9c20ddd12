export { migrate, seed }

import process from 'node:process'
import { runToEnd } from './child.mjs'
import { databaseEnvironment } from './database-environment.mjs'
import { step } from './progress.mjs'

/** Brings the database to the newest schema. */
function migrate(life, root, databaseUrl) {
  return runScript(life, root, 'migrate', databaseUrl, {
    name: 'Database',
    doing: 'bringing the schema up to date',
    failure: 'Bringing the database up to date did not work',
  })
}

/** Fills an empty database with the content that a new installation starts with. */
function seed(life, root, databaseUrl) {
  return runScript(life, root, 'seed', databaseUrl, {
    name: 'Content',
    doing: 'looking whether there is any yet',
    failure: 'Filling the database with its first content did not work',
  })
}

/** The last line that a script prints is the outcome that is shown. */
function runScript(life, root, script, databaseUrl, { name, doing, failure }) {
  const args = ['--import', 'tsx', `server/commands/${script}.ts`]
  const env =
    databaseUrl === process.env.DATABASE_URL
      ? process.env
      : databaseEnvironment({ DATABASE_URL: databaseUrl })
  const advice = 'Is DATABASE_URL right, and may its user create tables there?'
  return step(
    name,
    doing,
    () =>
      runToEnd(life, process.execPath, args, {
        cwd: root,
        env,
        failure,
        ...(env === process.env ? { advice } : {}),
      }),
    (output) => output.trim().split('\n').at(-1) || 'done',
  )
}
