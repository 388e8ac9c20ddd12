import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { ifMatch, sentEdit } from '../integration/edits-support.ts'
import { openBrowser, signInByForm, WIDTHS } from '../support/browser.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
})
afterAll(() => Promise.all([chromium.close(), app.stop()]))
beforeEach(async () => {
  await app.app.connection.pool.query('delete from cars')
})

const state = (page: Page) => page.locator('.mck')
/** Until it says so: where the car is kept. */
const kept = (page: Page, where: 'browser' | 'account') => state(page).getByText(`Saved in ${where === 'browser' ? 'this browser' : 'your account'}`).waitFor()
const value = (page: Page, key: string) => page.locator(`#value-${key}`)
const alive = (page: Page) => page.locator('.mc-units').waitFor()
async function openMyCar(page: Page): Promise<void> {
  await page.goto('/my-car')
  await alive(page)
}
const instrument = (page: Page, slug: string) => page.locator(`[data-island="calculator"]:has(#${slug})`)
const field = (page: Page, slug: string, key: string) => page.locator(`[name="${slug}.${key}"]`)
async function wake(page: Page, slug: string): Promise<void> {
  await instrument(page, slug).scrollIntoViewIfNeeded()
  await page.locator(`[data-alive]:has(#${slug})`).waitFor()
}
const cars = async () => (await app.app.connection.pool.query('select name, values, chosen from cars order by created_at, name')).rows

describe.each(WIDTHS)('a visitor at %i px', (width) => {
  it('enters a car once; a calculator starts from it, says so, and goes back to the guide’s values and to the car’s', async () => {
    const { page, complaints, close } = await chromium.visit(app.url, { width })
    await page.goto('/guides/shock-oil-and-pistons')
    await wake(page, 'fluid-temperature')
    const tape = instrument(page, 'fluid-temperature').locator('.ct')
    const height = (await tape.boundingBox())!.height
    const guides = await field(page, 'fluid-temperature', 'viscosityAt25').inputValue()
    await tape.getByRole('link', { name: 'Use my car’s values' }).click()
    await alive(page)
    // The address leads to what the calculator asked for.
    expect(new URL(page.url()).hash).toMatch(/^#value-/)
    expect(await page.locator('input:focus').getAttribute('name')).toMatch(/^value\./)
    await page.getByLabel('Name', { exact: true }).fill('Kestrel 8e')
    for (const key of ['frontDiffFluid', 'centreDiffFluid', 'rearDiffFluid', 'frontShockOil', 'rearShockOil']) {
      await page.evaluate((id) => (document.getElementById(id)!.closest('details')!.open = true), `value-${key}`)
      await value(page, key).fill('8,500')
    }
    await kept(page, 'browser')
    await page.goto('/guides/shock-oil-and-pistons')
    await wake(page, 'fluid-temperature')
    await tape.getByText('from my car', { exact: false }).waitFor()
    expect(await tape.innerText()).toContain('Kestrel 8e')
    expect((await tape.boundingBox())!.height).toBe(height)
    expect(await field(page, 'fluid-temperature', 'viscosityAt25').inputValue()).toBe('8,500')
    await tape.getByRole('link', { name: 'Guide’s values', exact: true }).click()
    expect(await field(page, 'fluid-temperature', 'viscosityAt25').inputValue()).toBe(guides)
    await tape.getByRole('link', { name: 'My car’s values', exact: true }).click()
    expect(await field(page, 'fluid-temperature', 'viscosityAt25').inputValue()).toBe('8,500')
    expect(complaints).toEqual([])
    await close()
  })

  it('is told in words what cannot be, and everything else is kept', async () => {
    const { page, close } = await chromium.visit(app.url, { width })
    await openMyCar(page)
    await value(page, 'mass').fill('3,6')
    await value(page, 'tyreDiameter').fill('3/32')
    await value(page, 'wheelbase').fill('12.8 in')
    expect(await page.locator('#value-tyreDiameter-error').innerText()).toMatch(/between 20\smm and 300\smm/)
    expect(await state(page).innerText()).toContain('all but one value')
    await page.reload()
    await alive(page)
    expect([await value(page, 'mass').inputValue(), await value(page, 'wheelbase').inputValue(), await value(page, 'tyreDiameter').inputValue()]).toEqual(['3.6', '325.12', ''])
    await close()
  })

  it('keeps several cars and chooses between them', async () => {
    const { page, close } = await chromium.visit(app.url, { width })
    await openMyCar(page)
    await value(page, 'mass').fill('3.6')
    await kept(page, 'browser')
    await page.getByRole('button', { name: 'Another car' }).click()
    await page.getByLabel('Name', { exact: true }).fill('Kestrel 10')
    await value(page, 'mass').fill('1.65')
    await page.getByRole('button', { name: 'Let calculators start from this car' }).click()
    await page.getByText('Calculators start from this car').waitFor()
    await page.goto('/calculators/roll-balance')
    await wake(page, 'roll-balance')
    await page.locator('.ct').getByText('Kestrel 10').waitFor()
    expect(await field(page, 'roll-balance', 'mass').inputValue()).toBe('1.65')
    await page.goto('/my-car')
    await alive(page)
    await page.getByText('Delete', { exact: true }).click()
    await page.getByRole('button', { name: 'Delete Kestrel 10' }).click()
    expect(await value(page, 'mass').inputValue()).toBe('3.6')
    await page.getByRole('button', { name: 'Bring it back' }).click()
    expect(await value(page, 'mass').inputValue()).toBe('1.65')
    await close()
  })
})

describe('instruments on one page', () => {
  it('follow each other at once where they ask for the same value, also one that comes alive later', async () => {
    const body = '## Two of them\n\n::calculator{slug=roll-balance}\n\n::calculator{slug=anti-squat}\n'
    const edit = await sentEdit(await app.signedIn('tomasz'), { guideSlug: 'rear-toe' }, { body })
    await (await app.signedIn('odile')).post(`/api/edits/${edit.id}/approve`).set(...ifMatch(edit)).send({ note: '' }).expect(200)
    const { page, complaints, close } = await chromium.visit(app.url)
    await page.goto('/guides/rear-toe')
    await wake(page, 'roll-balance')
    await field(page, 'roll-balance', 'mass').fill('3.21')
    await wake(page, 'anti-squat')
    expect(await field(page, 'anti-squat', 'mass').inputValue()).toBe('3.21')
    await field(page, 'anti-squat', 'wheelbase').fill('299')
    expect(await field(page, 'roll-balance', 'wheelbase').inputValue()).toBe('299')
    expect(complaints).toEqual([])
    await close()
  })

  it('keep what was typed when the car comes later', async () => {
    const { page, complaints, close } = await chromium.visit(app.url)
    await page.goto('/calculators/roll-balance')
    await page.evaluate(() =>
      localStorage.setItem('camber-clay.cars', JSON.stringify({ cars: [{ id: crypto.randomUUID(), name: 'Kestrel', carClass: null, values: { mass: 3.2, wheelbase: 322 } }], chosen: null })),
    )
    // Typed before the script is there.
    await page.route('**/*.js', async (route) => {
      await page.locator('body[data-go]').waitFor({ state: 'attached' })
      await route.continue()
    })
    await page.goto('/calculators/roll-balance', { waitUntil: 'commit' })
    await field(page, 'roll-balance', 'mass').fill('3.9')
    await page.evaluate(() => (document.body.dataset['go'] = ''))
    await wake(page, 'roll-balance')
    expect(await field(page, 'roll-balance', 'wheelbase').inputValue()).toBe('322')
    expect(await field(page, 'roll-balance', 'mass').inputValue()).toBe('3.9')
    expect(complaints).toEqual([])
    await close()
  })
})

describe('signing in', () => {
  it('brings the browser’s cars into the account and loses neither side', async () => {
    const priya = await app.signedIn('priya')
    const { page, close } = await chromium.visit(app.url)
    await openMyCar(page)
    await page.getByLabel('Name', { exact: true }).fill('Kestrel 8e')
    await value(page, 'mass').fill('3.6')
    await kept(page, 'browser')
    const mine = await page.evaluate(() => (JSON.parse(localStorage.getItem('camber-clay.cars')!) as { cars: { id: string }[] }).cars[0]!.id)
    await priya.post('/api/cars').send({ id: mine, name: 'Kestrel 8e', carClass: null, values: { mass: 3.4, cgHeight: 45 } }).expect(201)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await page.goto('/my-car')
    await page.getByText('The car that this browser kept is in your account now.').waitFor()
    expect(await cars()).toEqual([
      { name: 'Kestrel 8e', values: { mass: 3.4, cgHeight: 45 }, chosen: true },
      { name: 'Kestrel 8e (from this browser)', values: { mass: 3.6 }, chosen: false },
    ])
    expect(await page.evaluate(() => localStorage.getItem('camber-clay.cars'))).toBeNull()
    await close()
  })

  it('keeps what is typed in the account, in the browser while the account is away, and joins two tabs', async () => {
    const { page, context, close } = await chromium.visit(app.url)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await openMyCar(page)
    await value(page, 'mass').fill('1.65')
    await kept(page, 'account')
    const other = await context.newPage()
    await openMyCar(other)
    await value(other, 'wheelbase').fill('284')
    await kept(other, 'account')
    await value(page, 'tyreDiameter').fill('86')
    await page.waitForFunction(() => (document.querySelector('#value-wheelbase') as HTMLInputElement).value === '284')
    await kept(page, 'account')
    expect(await cars()).toMatchObject([{ values: { mass: 1.65, wheelbase: 284, tyreDiameter: 86 } }])
    await value(other, 'tyreDiameter').fill('87')
    await other.getByRole('button', { name: 'Keep what I typed here' }).click()
    await kept(other, 'account')
    expect(await cars()).toMatchObject([{ values: { mass: 1.65, wheelbase: 284, tyreDiameter: 87 } }])
    await other.route('**/api/cars/**', (route) => route.abort())
    await value(other, 'mass').fill('1.7')
    await other.getByText('Saved in this browser only: your account cannot be reached.').waitFor()
    await other.unroute('**/api/cars/**')
    await other.reload()
    await alive(other)
    await other.getByText('in your account now').waitFor()
    // On leaving, the page tries the account once more; whether that or the next page brings it, it gets there.
    expect((await cars()).map(({ values }: { values: { mass: number } }) => values.mass)).toEqual([1.7])
    await close()
  })

  it('brings back as they were the changes that the account did not hear of: a new name, a cleared value', async () => {
    const priya = await app.signedIn('priya')
    await priya.post('/api/cars').send({ id: crypto.randomUUID(), name: 'Kestrel', carClass: null, values: { mass: 3, wheelbase: 325 } }).expect(201)
    const { page, context, close } = await chromium.visit(app.url)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await openMyCar(page)
    await context.setOffline(true)
    await page.getByLabel('Name', { exact: true }).fill('Club car')
    await value(page, 'mass').fill('3.6')
    await value(page, 'wheelbase').fill('')
    await page.getByText('Saved in this browser only: your account cannot be reached.').waitFor()
    // The account stays away until the page is gone.
    await page.goto('about:blank')
    await context.setOffline(false)
    await openMyCar(page)
    await page.getByText('in your account now').waitFor()
    expect(await cars()).toEqual([{ name: 'Club car', values: { mass: 3.6 }, chosen: true }])
    expect([await value(page, 'mass').inputValue(), await value(page, 'wheelbase').inputValue()]).toEqual(['3.6', ''])
    await close()
  })

  it('gives a member’s car that waits in a shared browser to nobody else', async () => {
    const { page, context, close } = await chromium.visit(app.url)
    const { rows } = await app.app.connection.pool.query<{ id: string }>(`select id from members where key = 'priya'`)
    await page.goto('/robots.txt')
    await page.evaluate((owner) => {
      const car = { id: crypto.randomUUID(), name: 'Kestrel', carClass: null, values: { mass: 3.6 }, owner }
      localStorage.setItem('camber-clay.cars', JSON.stringify({ cars: [car], chosen: car.id }))
    }, rows[0]!.id)
    await openMyCar(page)
    expect(await value(page, 'mass').inputValue()).toBe('')
    await signInByForm(page, DEMO_PASSWORDS.odile!)
    await openMyCar(page)
    await value(page, 'spurTeeth').fill('46')
    await kept(page, 'account')
    expect(await cars()).toMatchObject([{ values: { spurTeeth: 46 } }])
    await page.goto('about:blank')
    await context.clearCookies()
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await openMyCar(page)
    await page.getByText('in your account now').waitFor()
    expect(await cars()).toMatchObject([{ values: { spurTeeth: 46 } }, { values: { mass: 3.6 } }])
    await close()
  })
})

describe('a page whose script comes late', () => {
  /** Opens a page that gets no script before `go`; the page after it gets its own once `next` is called. */
  async function openLate(page: Page, path: string): Promise<{ go(): void; next(): void }> {
    let late = true
    let go = () => {}
    const gate = new Promise<void>((resolve) => (go = resolve))
    await page.route('**/*.js', async (route) => {
      if (late) await gate
      await route.continue()
    })
    await page.goto(path, { waitUntil: 'commit' })
    return { go, next: () => (late = false) }
  }

  it('reads what was typed before in the units that stood there', async () => {
    const { page, complaints, close } = await chromium.visit(app.url)
    await page.goto('/robots.txt')
    await page.evaluate(() => localStorage.setItem('camber-clay.units', JSON.stringify({ length: 'in' })))
    const { go } = await openLate(page, '/my-car')
    await value(page, 'wheelbase').fill('325')
    await page.getByLabel('Name', { exact: true }).fill('Kestrel 8e')
    go()
    await kept(page, 'browser')
    expect(await value(page, 'wheelbase').inputValue()).toBe('12.79528')
    expect(await page.evaluate(() => (JSON.parse(localStorage.getItem('camber-clay.cars')!) as { cars: object[] }).cars)).toMatchObject([
      { name: 'Kestrel 8e', values: { wheelbase: 325 } },
    ])
    expect(complaints).toEqual([])
    await close()
  })

  it('keeps what a refused form held, with its words, and saves what can be', async () => {
    const { page, complaints, close } = await chromium.visit(app.url)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    const { next } = await openLate(page, '/my-car')
    await page.getByLabel('Name', { exact: true }).fill('Kestrel 8e')
    await page.getByLabel('Class', { exact: true }).selectOption('buggy_8e')
    await value(page, 'mass').fill('140')
    await value(page, 'wheelbase').fill('284')
    next()
    await value(page, 'wheelbase').press('Enter')
    await kept(page, 'account')
    expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Kestrel 8e')
    expect(await page.getByLabel('Class', { exact: true }).inputValue()).toBe('buggy_8e')
    expect([await value(page, 'mass').inputValue(), await value(page, 'wheelbase').inputValue()]).toEqual(['140', '284'])
    expect(await page.locator('#value-mass-error').innerText()).toMatch(/between 0.5\skg and 12\skg/)
    expect(await cars()).toEqual([{ name: 'Kestrel 8e', values: { wheelbase: 284 }, chosen: true }])
    expect(complaints.filter((each) => !each.includes('422'))).toEqual([])
    await close()
  })

  it('asks which numbers count when the car of a refused form was changed meanwhile', async () => {
    const priya = await app.signedIn('priya')
    const id = crypto.randomUUID()
    await priya.post('/api/cars').send({ id, name: 'Kestrel', carClass: null, values: { mass: 3 } }).expect(201)
    const { page, close } = await chromium.visit(app.url)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    const { next } = await openLate(page, '/my-car')
    await value(page, 'mass').fill('3.6')
    await priya.put(`/api/cars/${id}`).set('If-Match', '"1"').send({ name: 'Kestrel', carClass: null, values: { mass: 3.2 } }).expect(200)
    next()
    await value(page, 'mass').press('Enter')
    await page.getByRole('button', { name: 'Keep what I typed here' }).click()
    await kept(page, 'account')
    expect(await cars()).toEqual([{ name: 'Kestrel', values: { mass: 3.6 }, chosen: true }])
    await close()
  })
})

describe('a car that is open in two places', () => {
  it('follows another tab, but leaves alone what is half typed', async () => {
    const { page, context, close } = await chromium.visit(app.url)
    await openMyCar(page)
    await value(page, 'mass').fill('3.6')
    await kept(page, 'browser')
    await value(page, 'wheelbase').fill('325 m')
    const other = await context.newPage()
    await openMyCar(other)
    await value(other, 'mass').fill('3.7')
    await value(other, 'spurTeeth').fill('46')
    await page.waitForFunction(() => (document.querySelector('#value-spurTeeth') as HTMLInputElement).value === '46')
    expect([await value(page, 'mass').inputValue(), await value(page, 'wheelbase').inputValue()]).toEqual(['3.7', '325 m'])
    await close()
  })

  it('takes up what the account has by now when the browser shows the page again', async () => {
    const priya = await app.signedIn('priya')
    const id = crypto.randomUUID()
    await priya.post('/api/cars').send({ id, name: 'Kestrel', carClass: null, values: { mass: 3 } }).expect(201)
    const { page, close } = await chromium.visit(app.url)
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await openMyCar(page)
    await priya.put(`/api/cars/${id}`).set('If-Match', '"1"').send({ name: 'Kestrel', carClass: null, values: { mass: 3.2 } }).expect(200)
    await page.evaluate(() => dispatchEvent(new PageTransitionEvent('pageshow', { persisted: true })))
    await page.waitForFunction(() => (document.querySelector('#value-mass') as HTMLInputElement).value === '3.2')
    await close()
  })
})

describe('without JavaScript', () => {
  it('a member saves by form, and a visitor is told how else to carry numbers', async () => {
    const visitor = await chromium.visit(app.url, { width: 390, javaScript: false })
    await visitor.page.goto('/my-car')
    expect(await visitor.page.getByText('Without a script this browser cannot keep your car.').isVisible()).toBe(true)
    await visitor.close()
    const { page, close } = await chromium.visit(app.url, { width: 390, javaScript: false })
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await page.goto('/my-car')
    await value(page, 'mass').fill('140')
    await page.getByRole('button', { name: 'Save in your account' }).click()
    expect(await page.locator('#value-mass-error').innerText()).toMatch(/between 0.5\skg and 12\skg/)
    await value(page, 'mass').fill('1,65')
    await page.getByRole('button', { name: 'Save in your account' }).click()
    await page.getByText('Saved in your account.').waitFor()
    expect(await cars()).toEqual([{ name: 'My car', values: { mass: 1.65 }, chosen: true }])
    await page.goto('/calculators/roll-balance')
    expect(await field(page, 'roll-balance', 'mass').inputValue()).toBe('1.65')
    await page.getByRole('link', { name: 'Usual values' }).click()
    expect(await field(page, 'roll-balance', 'mass').inputValue()).toBe('3.6')
    await close()
  })
})

describe.each(['day', 'night'] as const)('on the %s sheet', (sheet) => {
  it.each(WIDTHS)('nothing breaks an accessibility rule or scrolls sideways at %i px', async (width) => {
    const { page, complaints, close } = await chromium.visit(app.url, { width, sheet })
    await openMyCar(page)
    await value(page, 'mass').fill('3.6')
    await value(page, 'tyreDiameter').fill('1')
    await page.evaluate(() => document.querySelectorAll('details').forEach((each) => (each.open = true)))
    const found = await page.evaluate(`(async () => { ${axeSource}
      const { violations } = await axe.run(document, { runOnly: ${JSON.stringify(RULES)} })
      return violations.map(({ id, nodes }) => id + ': ' + nodes.map((node) => node.target.join(' ')).join(', ')) })()`)
    expect(found).toEqual([])
    expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBeLessThanOrEqual(0)
    expect(complaints).toEqual([])
    await close()
  })
})
