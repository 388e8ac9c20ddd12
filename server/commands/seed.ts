import { seedDatabase } from '../seeding/index.ts'

const url = process.env.DATABASE_URL
if (url === undefined || url === '') {
  process.stderr.write('DATABASE_URL: say which database to fill, such as postgresql://localhost/camber\n')
  process.exit(1)
}
const { guides } = await seedDatabase(url, { demo: process.env.APP_MODE !== 'production' })
process.stdout.write(guides === 0 ? 'The book was already there.\n' : `${guides} guides were put into the book.\n`)
