import { JSDOM } from 'jsdom'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { aCar, createCar, newId } from './cars-support.ts'
import { rows, type Agent } from './edits-support.ts'
import type { CarView, MergedCars } from '#shared/schemas/car.ts'

let app: TestApp
let priya: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from rate_limits')
  await rows(app, 'delete from cars')
})

async function merge(cars: object[], chosen: string | null = null): Promise<MergedCars> {
  return (await priya.post('/api/cars/merge').send({ cars, chosen }).expect(200)).body as MergedCars
}

describe('bringing a browser’s cars into the account', () => {
  it('takes in what is new and chooses what the browser had chosen, if nothing was', async () => {
    const [one, two] = [aCar({ name: 'One', values: { mass: 3 } }), aCar({ name: 'Two', values: { mass: 2 } })]
    const { cars, held } = await merge([one, two], two.id)
    expect(held).toEqual([one.id, two.id])
    expect(cars.map(({ name, chosen, values }) => ({ name, chosen, values }))).toEqual([
      { name: 'One', chosen: false, values: { mass: 3 } },
      { name: 'Two', chosen: true, values: { mass: 2 } },
    ])
  })

  it('fills gaps, under a new version', async () => {
    const car = await createCar(priya, { values: { mass: 3 } })
    const { cars } = await merge([aCar({ id: car.id, values: { mass: 3, wheelbase: 325 } })])
    expect(cars).toMatchObject([{ id: car.id, version: 2, values: { mass: 3, wheelbase: 325 } }])
  })

  it('loses neither side of a contradiction, however often it is sent', async () => {
    const car = await createCar(priya, { name: 'Kestrel', values: { mass: 3, cgHeight: 45 } })
    const browser = aCar({ id: car.id, name: 'Kestrel', values: { mass: 3.2, wheelbase: 325 } })
    const [first, second] = await Promise.all([merge([browser]), merge([browser])])
    const third = await merge([browser])
    for (const { held } of [first, second, third]) expect(held).toEqual([car.id])
    expect(third.cars).toMatchObject([
      { id: car.id, version: 1, chosen: true, values: { mass: 3, cgHeight: 45 } },
      { name: 'Kestrel (from this browser)', chosen: false, values: { mass: 3.2, wheelbase: 325 } },
    ])
  })

  it('answers again under the same Idempotency-Key', async () => {
    const body = { cars: [aCar()], chosen: null }
    const ask = () => priya.post('/api/cars/merge').set('Idempotency-Key', 'the-same-key').send(body)
    const [one, again] = [await ask(), await ask()]
    expect(again.body).toEqual(one.body)
    await priya.post('/api/cars/merge').set('Idempotency-Key', 'the-same-key').send({ cars: [], chosen: null }).expect(422)
  })

  it('says which cars found no room', async () => {
    for (let n = 1; n <= 19; n += 1) await createCar(priya)
    const [fits, waits] = [aCar(), aCar()]
    const { cars, held } = await merge([fits, waits])
    expect(cars).toHaveLength(20)
    expect(held).toEqual([fits.id])
  })

  it('takes all or nothing of one request, and nothing that cannot be', async () => {
    const answer = await priya.post('/api/cars/merge').send({ cars: [aCar(), aCar({ values: { frontWeight: 140 } })] }).expect(422)
    expect(answer.body.errors).toMatchObject([{ field: 'cars.1.values.frontWeight' }])
    const twice = aCar()
    await priya.post('/api/cars/merge').send({ cars: [twice, twice] }).expect(422)
    await priya.post('/api/cars/merge').send({ cars: Array.from({ length: 21 }, () => aCar()) }).expect(422)
    expect((await priya.get('/api/cars')).body).toEqual([])
  })
})

describe('pages of who is signed in', () => {
  const propsOf = (html: string) => {
    const raw = /data-island="calculator"[^>]*data-props="([^"]*)"/.exec(html)?.[1] ?? ''
    return JSON.parse(raw.replaceAll('&quot;', '"').replaceAll('&#39;', "'").replaceAll('&amp;', '&')) as { car?: CarView }
  }

  it.each(['/calculators/fluid-temperature', '/guides/shock-oil-and-pistons'])('%s starts from the chosen car; a visitor’s is the same for all', async (path) => {
    const car = await createCar(priya, { name: 'Kestrel 10', values: { frontDiffFluid: 5000, frontShockOil: 450 } })
    expect(propsOf((await priya.get(path).expect(200)).text).car).toEqual({ id: car.id, name: 'Kestrel 10', values: car.values })
    const visitor = await app.agent().get(path).expect(200)
    expect(propsOf(visitor.text).car).toBeUndefined()
    expect(visitor.text).not.toContain('Kestrel 10')
  })
})

describe('the forms of “My car”', () => {
  it('make, fill in, copy, choose and delete a car without a script', async () => {
    const id = newId()
    await priya.post('/my-car').type('form').send({ id, name: 'Kestrel 8e', 'value.mass': '3,6' }).expect(303).expect('Location', `/my-car?car=${id}&said=saved`)
    await priya.post(`/my-car/${id}`).type('form').send({ version: '1', name: 'Kestrel 8e', carClass: 'buggy_8e', 'value.mass': '3,6', 'value.frontBarDiameter': '3/32 in' }).expect(303)
    const [car] = (await priya.get('/api/cars')).body as CarView[]
    expect(car).toMatchObject({ name: 'Kestrel 8e', carClass: 'buggy_8e', version: 2, values: { mass: 3.6 } })
    expect(car!.values.frontBarDiameter).toBeCloseTo(2.38125, 12)
    const copyId = newId()
    await priya.post(`/my-car/${id}/copy`).type('form').send({ copyId }).expect(303)
    await priya.post(`/my-car/${copyId}/choose`).type('form').send({}).expect(303)
    await priya.post(`/my-car/${id}/delete`).type('form').send({ version: '2' }).expect(303)
    expect((await priya.get('/api/cars')).body).toMatchObject([{ id: copyId, name: 'Kestrel 8e (copy)', chosen: true, values: car!.values }])
  })

  it('show again what was typed, with words at the field', async () => {
    const car = await createCar(priya, { values: { mass: 3 } })
    const answer = await priya.post(`/my-car/${car.id}`).type('form').send({ version: '1', name: car.name, 'value.mass': 'heavy <b>', 'value.frontWeight': '140' }).expect(422)
    expect(answer.text).toContain('value="heavy &lt;b&gt;"')
    expect(answer.text).toMatch(/Weight on the front wheels must be between 20\s%/)
    const stale = await priya.post(`/my-car/${car.id}`).type('form').send({ version: '9', name: car.name, 'value.mass': '3.3' }).expect(412)
    expect(stale.text).toContain('value="3.3"')
    expect((await priya.get('/api/cars')).body).toMatchObject([{ version: 1, values: { mass: 3 } }])
  })

  it('show again a refused car with its name and class, on the car that the form was about', async () => {
    const first = await createCar(priya, { name: 'Kestrel 8e', values: { mass: 3.4 } })
    const id = newId()
    const posted = { id, name: 'Club car', carClass: 'truggy_8', 'value.mass': '140', 'value.wheelbase': '284' }
    const page = new JSDOM((await priya.post('/my-car').type('form').send(posted).expect(422)).text).window.document
    const field = (name: string) => page.querySelector<HTMLInputElement>(`.mc-m [name="${name}"]:not([type=hidden])`)
    expect([field('name'), field('value.mass'), field('value.wheelbase')].map((each) => each?.getAttribute('value'))).toEqual(['Club car', '140', '284'])
    expect(page.querySelector<HTMLSelectElement>('select[name=carClass]')!.value).toBe('truggy_8')
    expect(page.querySelector<HTMLInputElement>('#car input[name=id]')!.value).toBe(id)
    const changed = { version: '1', name: 'Kestrel 8e', carClass: 'tank', 'value.mass': '140' }
    const again = new JSDOM((await priya.post(`/my-car/${first.id}`).type('form').send(changed).expect(422)).text).window.document
    expect(again.querySelector('#value-mass')!.getAttribute('value')).toBe('140')
  })

  it('begin another car under a name that is free, and leave the open one alone when it is refused', async () => {
    await createCar(priya, { name: 'Car 2', values: { mass: 3.4 } })
    const page = new JSDOM((await priya.get('/my-car').expect(200)).text).window.document
    const offered = page.querySelector<HTMLInputElement>('form[action="/my-car"] input[name=name]')!.value
    expect(offered).toBe('Car 2 (new)')
    const refused = new JSDOM((await priya.post('/my-car').type('form').send({ id: newId(), name: 'Car 2' }).expect(422)).text).window.document
    expect(refused.querySelector('#errors')?.textContent).toContain('already have a car called')
    expect(refused.querySelector('#value-mass')!.getAttribute('value')).toBe('3.4')
  })

  it('say it in words when the car was changed meanwhile', async () => {
    const car = await createCar(priya)
    const stale = new JSDOM((await priya.post(`/my-car/${car.id}`).type('form').send({ version: '9', name: car.name, 'value.mass': '3.3' }).expect(412)).text).window.document
    expect(stale.querySelector('#errors')?.textContent).toContain('in another tab or on another device')
    expect(stale.querySelector<HTMLInputElement>('#car input[name=version]')!.value).toBe('1')
  })

  it('give everything that was typed back to who is no longer signed in', async () => {
    const posted = { id: newId(), name: 'Kestrel 8e', 'value.mass': '3,6', 'value.frontBarDiameter': '3/32 in', 'value.wheelbase': '' }
    const page = new JSDOM((await app.agent().post('/my-car').type('form').send(posted).expect(401)).text).window.document
    const typed = [...page.querySelectorAll('textarea')].map(({ name, value }) => [name, value])
    expect(typed).toEqual([['typed.name', 'Kestrel 8e'], ['typed.value.mass', '3,6'], ['typed.value.frontBarDiameter', '3/32 in']])
    expect(page.body.textContent).toContain('Weight of the whole car, kg')
    expect(page.querySelector<HTMLInputElement>('input[name=next]')!.value).toBe('/my-car')
  })

  it('ask a visitor to sign in', async () => {
    await app.agent().post('/my-car').type('form').send({ id: newId(), name: ' ' }).redirects(0).expect(303).expect('Location', /^\/sign-in/)
  })
})
