import { readConfig } from '../config.ts'
import { connectDatabase } from '../db/client.ts'
import { isAppError } from '../errors.ts'
import { makeAdmin } from '../people/make-admin.ts'
import { TOKEN_MINUTES } from '../people/tokens.ts'

// npm run make-admin -- "Wanda Okonjo-Field" wanda@club.example
async function main(): Promise<void> {
  const [name, email, ...rest] = process.argv.slice(2)
  if (name === undefined || email === undefined || rest.length > 0) {
    throw new Error('Say who: npm run make-admin -- "Name" name@club.example')
  }
  const config = readConfig(process.env)
  const connection = connectDatabase(config.databaseUrl, { max: 1 })
  try {
    const link = await makeAdmin({ config, db: connection.db, clock: () => new Date() }, { name, email })
    process.stdout.write(`${email} is an admin now. To set a password, within ${TOKEN_MINUTES.reset} minutes and once:\n${link}\n`)
  } finally {
    await connection.close()
  }
}

main().catch((error: unknown) => {
  const lines = isAppError(error) ? [error.message, ...error.fields.map((field) => field.message)] : [String((error as Error).message)]
  process.stderr.write(`${lines.join('\n')}\n`)
  process.exit(1)
})
