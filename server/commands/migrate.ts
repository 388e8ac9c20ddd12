import { migrateDatabase } from '../db/migrate.ts'

const url = process.env.DATABASE_URL
if (url === undefined || url === '') {
  process.stderr.write('DATABASE_URL: say which database to bring up to date, such as postgresql://localhost/camber\n')
  process.exit(1)
}
await migrateDatabase(url)
process.stdout.write('The database has the newest schema.\n')
