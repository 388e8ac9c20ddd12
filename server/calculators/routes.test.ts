import express, { type NextFunction, type Request, type Response } from 'express'
import request from 'supertest'
import { beforeAll, describe, expect, it } from 'vitest'
import { isAppError } from '#server/errors.ts'
import { loadCalculators } from './load-registry.ts'
import { calculatorRoutes } from './routes.ts'

const app = express()

beforeAll(async () => {
  app.use(express.json())
  app.use('/api', calculatorRoutes(await loadCalculators()))
  app.use((error: unknown, _request: Request, response: Response, next: NextFunction) => {
    if (!isAppError(error)) return next(error)
    response.status(error.status).json({ code: error.code, detail: error.message, errors: error.fields })
  })
})

const run = (slug: string, body: unknown) =>
  request(app)
    .post(`/api/calculators/${slug}/run`)
    .set('Content-Type', 'application/json')
    .send(typeof body === 'string' ? body : JSON.stringify(body))

describe('GET /api/calculators', () => {
  it('lists every calculator with keys, units, defaults and ranges', async () => {
    const { body } = await request(app).get('/api/calculators').expect(200)
    expect(body.find((entry: { slug: string }) => entry.slug === 'fluid-temperature')).toEqual({
      slug: 'fluid-temperature',
      title: 'What your fluid acts like when it is hot',
      inputs: [
        { key: 'viscosityAt25', unit: 'cSt', default: 7000, min: 0.5, max: 10_000_000 },
        { key: 'referenceTemperature', unit: '°C', default: 25, min: -25, max: 100 },
        { key: 'temperature', unit: '°C', default: 40, min: -25, max: 100 },
      ],
      outputs: [
        { key: 'viscosity', unit: 'cSt' },
        { key: 'viscosityAtReference', unit: 'cSt' },
        { key: 'ratio', unit: '1' },
        { key: 'fluidToMatch', unit: 'cSt' },
      ],
    })
    expect(body.map((entry: { slug: string }) => entry.slug)).toContain('fluid-blend')
  })
})

describe('POST /api/calculators/:slug/run', () => {
  it('computes in double precision and shows the working', async () => {
    const { body } = await run('fluid-temperature', {
      inputs: { viscosityAt25: 100, temperature: 40 },
    }).expect(200)
    expect(body.outputs.viscosity).toBeCloseTo(75.3843, 4)
    expect(body.inputs).toEqual({ viscosityAt25: 100, referenceTemperature: 25, temperature: 40 })
    expect(body.answer).toBe('Your 100\u00A0cSt fluid acts like about 75.4\u00A0cSt at 40\u00A0°C.')
    expect(body.warnings).toEqual([])
    expect(body.working[0]).toMatchObject({
      formula: 'ν = ν_25 × 10^(763.1 × ((1)/(273 + T) − (1)/(298)))',
      unit: 'cSt',
    })
  })

  it('says where a formula holds less well', async () => {
    const { body } = await run('fluid-temperature', { inputs: { temperature: 80 } }).expect(200)
    expect(body.warnings).toMatchObject([{ field: 'temperature' }])
  })

  it.each([
    ['a value out of range', { inputs: { temperature: 101 } }, 'temperature'],
    ['text', { inputs: { temperature: '40' } }, 'temperature'],
    ['null', { inputs: { temperature: null } }, 'temperature'],
    ['NaN as JSON writes it', '{"inputs":{"temperature":null}}', 'temperature'],
    ['a number too large for a double', '{"inputs":{"temperature":1e999}}', 'temperature'],
    ['an unknown key', { inputs: { temprature: 40 } }, 'temprature'],
    ['the prototype as a key', '{"inputs":{"__proto__":{"temperature":40}}}', '__proto__'],
    ['no inputs', {}, 'inputs'],
    ['a list of inputs', { inputs: [40] }, 'inputs'],
    ['an unknown member', { inputs: {}, unit: '°F' }, 'unit'],
    ['a list', [], ''],
  ])('refuses %s at the field', async (_what, sent, field) => {
    const { body } = await run('fluid-temperature', sent).expect(422)
    expect(body.errors.map((error: { field: string }) => error.field)).toEqual([field])
    expect(body.errors[0].message.length).toBeGreaterThan(10)
  })

  it('refuses a blend that cannot be reached', async () => {
    const { body } = await run('fluid-blend', { inputs: { targetViscosity: 20000 } }).expect(422)
    expect(body.errors).toMatchObject([
      { field: 'targetViscosity', message: expect.stringContaining('cannot be reached') },
    ])
  })

  it('answers 404 for a calculator there is not', async () => {
    await run('fluid', { inputs: {} }).expect(404)
    await run('__proto__', { inputs: {} }).expect(404)
  })
})
