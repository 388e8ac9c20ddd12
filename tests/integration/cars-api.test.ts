import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { aCar, createCar, newId, tag } from './cars-support.ts'
import { rows, type Agent } from './edits-support.ts'
import { CARS_AT_MOST } from '#shared/cars/car.ts'
import type { CarView } from '#shared/schemas/car.ts'

let app: TestApp
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from rate_limits')
  await rows(app, 'delete from cars')
})

const list = async (agent: Agent) => (await agent.get('/api/cars').expect(200)).body as CarView[]

describe('one’s own cars', () => {
  it('are kept, changed under their version, and deleted', async () => {
    const car = await createCar(priya, { name: 'Kestrel 10', carClass: 'buggy_10_4wd', values: { mass: 1.65 } })
    expect(car).toMatchObject({ name: 'Kestrel 10', carClass: 'buggy_10_4wd', values: { mass: 1.65 }, chosen: true, version: 1 })
    const { id: _id, ...fields } = aCar({ name: 'Kestrel 10', values: { mass: 1.65, wheelbase: 284 } })
    const saved = await priya.put(`/api/cars/${car.id}`).set(...tag(car)).send(fields).expect(200)
    expect(saved.headers.etag).toBe('"2"')
    expect(saved.body).toMatchObject({ values: { mass: 1.65, wheelbase: 284 }, carClass: null, version: 2 })
    await priya.delete(`/api/cars/${car.id}`).set(...tag(car)).expect(412)
    await priya.delete(`/api/cars/${car.id}`).set('If-Match', '"2"').expect(204)
    expect(await list(priya)).toEqual([])
  })

  it('are nobody else’s business: reading, changing, choosing and deleting find nothing', async () => {
    const car = await createCar(priya, { values: { mass: 1.65 } })
    const { id, ...fields } = aCar({ id: car.id, name: 'Mine now' })
    await odile.put(`/api/cars/${id}`).set(...tag(car)).send(fields).expect(404)
    await odile.post(`/api/cars/${id}/choose`).send({}).expect(404)
    await odile.delete(`/api/cars/${id}`).set(...tag(car)).expect(404)
    await odile.put(`/api/cars/${newId()}`).set(...tag(car)).send(fields).expect(404)
    await odile.put('/api/cars/no-uuid').set(...tag(car)).send(fields).expect(404)
    // The same id is free for someone else, so that nobody can get into another’s way.
    await createCar(odile, { id: car.id, name: 'Hers' })
    expect(await list(priya)).toMatchObject([{ id: car.id, name: car.name, values: { mass: 1.65 } }])
  })

  it('want If-Match, and say which version there is', async () => {
    const car = await createCar(priya)
    const { id, ...fields } = aCar({ id: car.id })
    await priya.put(`/api/cars/${id}`).send(fields).expect(428)
    await priya.delete(`/api/cars/${id}`).expect(428)
    const stale = await priya.put(`/api/cars/${id}`).set('If-Match', '"7"').send(fields).expect(412)
    expect(stale.body).toMatchObject({ code: 'precondition_failed', version: 1 })
  })

  it('take one of several saves that come at once', async () => {
    const car = await createCar(priya)
    const save = (mass: number) => priya.put(`/api/cars/${car.id}`).set(...tag(car)).send({ name: car.name, carClass: null, values: { mass } })
    const answers = await Promise.all([save(1), save(2), save(3), save(4)])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412, 412, 412])
    expect((await list(priya))[0]).toMatchObject({ version: 2, values: (answers.find(({ status }) => status === 200)!.body as CarView).values })
  })

  it('come in once, however often they are sent', async () => {
    const car = aCar({ values: { mass: 3 } })
    const answers = await Promise.all([1, 2, 3].map(() => priya.post('/api/cars').send(car)))
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 201])
    await priya.post('/api/cars').send({ ...car, values: { mass: 4 } }).expect(409).expect(({ body }) => expect(body.code).toBe('car_exists'))
    expect(await list(priya)).toHaveLength(1)
  })

  it('have each a name of its own, whatever its capitals', async () => {
    const car = await createCar(priya, { name: 'Kestrel 8e' })
    const answer = await priya.post('/api/cars').send(aCar({ name: ' kestrel 8E ' })).expect(422)
    expect(answer.body.errors).toMatchObject([{ field: 'name', message: expect.stringContaining('already have a car called') }])
    const other = await createCar(priya, { name: 'Kestrel 10' })
    await priya.put(`/api/cars/${other.id}`).set(...tag(other)).send({ name: 'KESTREL 8E', carClass: null, values: {} }).expect(422)
    await priya.put(`/api/cars/${car.id}`).set(...tag(car)).send({ name: 'Kestrel 8E', carClass: null, values: {} }).expect(200)
  })

  it('are twenty at most, also when they come at once', async () => {
    for (let n = 1; n <= 18; n += 1) await createCar(priya)
    const answers = await Promise.all(Array.from({ length: 5 }, () => priya.post('/api/cars').send(aCar())))
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 201, 409, 409, 409])
    expect(await list(priya)).toHaveLength(20)
  })

  it('are refused by the database too when there are too many, or the values are no object', async () => {
    const [member] = await rows<{ id: string }>(app, `select id from members where key = 'imre'`)
    const insert = (values: string) =>
      rows(app, 'insert into cars (member_id, id, name, values) values ($1, $2, $3, $4)', [member!.id, newId(), newId(), values])
    for (let n = 1; n <= CARS_AT_MOST; n += 1) await insert('{}')
    await expect(insert('{}')).rejects.toThrow(`at most ${CARS_AT_MOST} cars`)
    await rows(app, 'delete from cars')
    await expect(insert('[]')).rejects.toThrow('cars_values_object')
    await expect(insert(JSON.stringify({ x: 'x'.repeat(20_000) }))).rejects.toThrow('cars_values_size')
  })

  it('have one that is chosen: the first, then the one that is asked for, then the one changed last', async () => {
    const [first, second, third] = [await createCar(priya), await createCar(priya), await createCar(priya)]
    const chosen = async () => (await list(priya)).filter((car) => car.chosen).map(({ id }) => id)
    expect(await chosen()).toEqual([first.id])
    await Promise.all([priya.post(`/api/cars/${second.id}/choose`).send({}).expect(200), priya.post(`/api/cars/${third.id}/choose`).send({}).expect(200)])
    expect(await chosen()).toHaveLength(1)
    await priya.post(`/api/cars/${third.id}/choose`).send({}).expect(200)
    await priya.put(`/api/cars/${first.id}`).set(...tag(first)).send({ name: first.name, carClass: null, values: { mass: 2 } }).expect(200)
    await priya.delete(`/api/cars/${third.id}`).set(...tag(third)).expect(204)
    expect(await chosen()).toEqual([first.id])
  })
})

describe('what cannot be a car is refused with words', () => {
  it.each<[string, object, string, RegExp]>([
    ['140 % on the front wheels', { frontWeight: 140 }, 'values.frontWeight', /between 20\s%/],
    ['text for a number', { mass: '3' }, 'values.mass', /must be a number/],
    ['null', { mass: null }, 'values.mass', /must be a number/],
    ['a value that no car has', { wings: 2 }, 'values.wings', /not a field/],
    ['half a tooth', { spurTeeth: 46.5 }, 'values.spurTeeth', /whole number/],
    ['a tyre inside its rim', { tyreDiameter: 80, rimDiameter: 83 }, 'values.tyreDiameter', /does not go over/],
    ['an arm turned inside out', { rearLowerInnerY: 100, rearLowerOuterY: 30 }, 'values.rearLowerOuterY', /not further out/],
  ])('%s', async (_what, values, field, message) => {
    const answer = await priya.post('/api/cars').send({ ...aCar(), values }).expect(422)
    expect(answer.body.errors).toMatchObject([{ field, message: expect.stringMatching(message) }])
    expect(await list(priya)).toEqual([])
  })

  it.each<[string, object]>([
    ['nothing', {}],
    ['a list', [] as object],
    ['no id', { name: 'x', values: {} }],
    ['an id that is none', { ...aCar(), id: '1; drop table cars' }],
    ['a class that is none', { ...aCar(), carClass: 'tank' }],
    ['an empty name', { ...aCar(), name: '  ' }],
    ['a name on two lines', { ...aCar(), name: 'a\nb' }],
    ['half a character', { ...aCar(), name: '\ud83d' }],
    ['a very long name', { ...aCar(), name: 'x'.repeat(61) }],
    ['somebody as its owner', { ...aCar(), memberId: newId() }],
    ['chosen from outside', { ...aCar(), chosen: true }],
    ['values that are a list', { ...aCar(), values: [] }],
    ['ten thousand made-up keys', { ...aCar(), values: Object.fromEntries(Array.from({ length: 10_000 }, (_, n) => [`k${n}`, n])) }],
  ])('%s', async (_what, body) => {
    const answer = await priya.post('/api/cars').send(body).expect(422)
    expect(answer.type).toBe('application/problem+json')
    expect(answer.text.length).toBeLessThan(10_000)
  })

  it('a key that every object has', async () => {
    const body = `{"id":"${newId()}","name":"Proto","values":{"__proto__":{"mass":3},"constructor":1}}`
    const answer = await priya.post('/api/cars').set('Content-Type', 'application/json').send(body)
    expect(answer.status).toBe(422)
    expect(answer.text).toContain('constructor')
  })

  it('more than one request may carry', async () => {
    await priya.post('/api/cars').send({ ...aCar(), name: 'x'.repeat(800_000) }).expect(413)
  })

  it('saving without end', async () => {
    await rows(app, `insert into rate_limits (key, points, expire) select 'car:' || id, 300, (extract(epoch from now()) * 1000)::bigint + 600000 from members where key = 'priya'`)
    const answer = await priya.post('/api/cars').send(aCar()).expect(429)
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0)
  })
})
