import { afterAll, beforeAll, expect, it } from 'vitest'
import { visitor, type ServiceContext } from '#server/context.ts'
import { listWantedGuides } from '#server/guides/index.ts'
import { seedDatabase } from '#server/seeding/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { ifMatch, saveEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let ctx: ServiceContext
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  ctx = { ...app.app, actor: visitor, requestId: 'test', address: '127.0.0.1' }
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())

const titles = async () => (await listWantedGuides(ctx)).map(({ title }) => title)

async function publish(start: { chapter: string; wanted?: string }, title: string): Promise<void> {
  const begun = (await priya.post('/api/edits').send(start).expect(201)).body
  const saved = await saveEdit(priya, begun, { ...WHOLE_GUIDE, title }, 'A new guide')
  const sent = (await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(200)).body
  await odile.post(`/api/edits/${saved.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)
}

it('a guide begun from a wish carries its title, and takes it off the list when it is approved', async () => {
  const [wish] = await listWantedGuides(ctx)
  const begun = (await priya.post('/api/edits').send({ chapter: wish!.chapter, wanted: wish!.id }).expect(201)).body
  expect(begun.content.title).toBe(wish!.title)
  expect(await titles()).toContain(wish!.title)
  await publish({ chapter: wish!.chapter, wanted: wish!.id }, 'Quite another title')
  expect(await titles()).not.toContain(wish!.title)
  // Who had begun from the same wish goes on.
  await saveEdit(priya, begun, WHOLE_GUIDE)
})

it('a guide with the title of a wish grants it, and seeding does not bring it back', async () => {
  const [wish, ...others] = await listWantedGuides(ctx)
  await publish({ chapter: wish!.chapter }, wish!.title.toUpperCase())
  await seedDatabase(app.databaseUrl, { demo: true })
  expect(await titles()).toEqual(others.map(({ title }) => title))
})

it('a wish that is not there any more, or is of another chapter, is no hindrance', async () => {
  const [wish] = await listWantedGuides(ctx)
  const chapter = wish!.chapter === 'A' ? 'B' : 'A'
  expect((await priya.post('/api/edits').send({ chapter, wanted: wish!.id }).expect(201)).body.content.title).toBe('')
  await priya.post('/api/edits').send({ chapter, wanted: 'none' }).expect(422)
})

it('the form carries the wish', async () => {
  const [wish] = await listWantedGuides(ctx)
  const answer = await priya.post('/write').type('form').send({ chapter: wish!.chapter, wanted: wish!.id }).expect(303)
  const { body } = await priya.get(`/api/edits/${String(answer.headers['location']).split('/').at(-1)}`).expect(200)
  expect(body.content.title).toBe(wish!.title)
})
