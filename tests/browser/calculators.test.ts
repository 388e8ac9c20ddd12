import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { Page } from 'playwright-core'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { loadCalculators } from '#server/calculators/index.ts'
import { linkQuery } from '#shared/calculators/query.ts'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { nextStep } from '#shared/calculators/steps.ts'
import { unitGroupsOf, type UnitChoices } from '#shared/units/unit-choices.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { openBrowser, type Visit } from '../support/browser.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']
const calculators = [...(await loadCalculators())]

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
let plain: Visit
let phone: Visit
let desk: Visit
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
  plain = await chromium.visit(app.url, { width: 390, javaScript: false })
  phone = await chromium.visit(app.url, { width: 390 })
  desk = await chromium.visit(app.url, { width: 1280 })
})
afterAll(async () => {
  await chromium.close()
  await app.stop()
})

// What the browser itself complained about: script errors, refused resources, pages that hydrate to something else.
afterEach(() => expect([...phone.complaints, ...desk.complaints]).toEqual([]))

/** A field one step away from its usual value, with an answer and nothing to warn of. */
function changeOf(definition: CalculatorDefinition): { key: string; value: number } {
  for (const input of definition.inputs) {
    for (const direction of ['up', 'down'] as const) {
      const value = nextStep(input, input.default, direction, input.unit)
      const run = value === undefined ? undefined : runDefinition(definition, { [input.key]: value })
      if (value !== undefined && run?.ok && run.warnings.length === 0) return { key: input.key, value }
    }
  }
  throw new Error(`${definition.slug} has no field that can be changed by a step`)
}

function answerTo(definition: CalculatorDefinition, values: Record<string, number>, choices: UnitChoices = {}): string {
  const run = runDefinition(definition, values)
  if (!run.ok) throw new Error('no answer')
  return plainSentence(definition.answer(run.inputs, run.outputs).says, choices)
}

const field = (page: Page, slug: string, key: string) => page.locator(`input[type=text][name="${slug}.${key}"]`)
const said = async (page: Page) => (await page.locator('.says').textContent())!.trim()

async function open(page: Page, path: string): Promise<void> {
  await page.goto(path)
  await page.locator('[data-island][data-alive]').waitFor({ state: 'attached' })
}

/** Where the form stands on the page, and how large it is. */
function formBox(page: Page): Promise<number[]> {
  return page.locator('form.calc-i').evaluate((form) => {
    const { left, top, width, height } = form.getBoundingClientRect()
    return [left + scrollX, top + scrollY, width, height].map(Math.round)
  })
}

const sideways = (page: Page) => page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

async function accessibilityFaults(page: Page): Promise<string[]> {
  // The policy of the page lets no script of ours in, so axe comes through the browser's own door.
  return page.evaluate(`(async () => { if (!window.axe) { ${axeSource} }
    const { violations } = await axe.run(document, { runOnly: ${JSON.stringify(RULES)} })
    return violations.map(({ id, nodes }) => id + ': ' + nodes.map((node) => node.target.join(' ')).join(', ')) })()`)
}

describe.each(calculators)('%s', (slug, definition) => {
  const path = `/calculators/${slug}`
  const change = changeOf(definition)
  const changed = { [change.key]: change.value }
  const answer = answerTo(definition, changed)

  it('computes by form without JavaScript', async () => {
    const { page } = plain
    await page.goto(path)
    expect(await said(page)).toBe(answerTo(definition, {}))
    expect(await page.getByRole('slider').count()).toBe(0)
    await field(page, slug, change.key).fill(String(change.value))
    await page.getByRole('button', { name: 'Work it out' }).last().click()
    await page.waitForURL(/\?/)
    expect(await said(page)).toBe(answer)
    expect(await sideways(page)).toBeLessThanOrEqual(0)
  })

  it.each([
    ['phone', () => phone],
    ['desk', () => desk],
  ])('answers while one types and moves nothing, on a %s', async (_where, visit) => {
    const { page } = visit()
    await open(page, path)
    const before = await formBox(page)
    await field(page, slug, change.key).fill(String(change.value))
    await expect.poll(() => said(page)).toBe(answer)
    expect(await formBox(page)).toEqual(before)
  })

  it('opens a link with the same numbers, and follows the reader’s units everywhere', async () => {
    const { page } = desk
    await open(page, `${path}?${linkQuery(definition, slug, changed)}`)
    expect(await said(page)).toBe(answer)
    const link = await page.getByLabel('Link with these numbers').inputValue()
    const shown = new URL(link).searchParams
    for (const { key, default: usual } of definition.inputs)
      expect(Number(shown.get(`${slug}.${key}`))).toBe(changed[key] ?? usual)

    const used = [...definition.inputs, ...definition.outputs.filter(({ fixedUnit }) => !fixedUnit)].map(({ unit }) => unit)
    const choices: UnitChoices = {}
    for (const { key, options } of unitGroupsOf(used)) {
      choices[key] = options[1]!.id
      await page.locator(`[name="${slug}.unit.${key}"]`).selectOption(choices[key]!)
    }
    await expect.poll(() => said(page)).toBe(answerTo(definition, changed, choices))
    // The link always speaks the calculator's own units.
    expect(await page.getByLabel('Link with these numbers').inputValue()).toBe(link)
    await page.evaluate(() => localStorage.clear())
  })

  it('breaks no accessibility rule and never scrolls sideways', async () => {
    for (const { page } of [phone, desk]) {
      await open(page, path)
      await page.locator('details.work').evaluate((details: HTMLDetailsElement) => (details.open = true))
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme })
        // Buttons change colour over a moment, and axe must not measure one half-way between two sheets.
        await page.evaluate(async () => {
          await new Promise(requestAnimationFrame)
          await Promise.allSettled(document.getAnimations().map(({ finished }) => finished))
        })
        expect(await accessibilityFaults(page), colorScheme).toEqual([])
      }
      await page.emulateMedia({ colorScheme: 'light' })
    }
    await phone.page.setViewportSize({ width: 360, height: 800 })
    expect(await sideways(phone.page)).toBeLessThanOrEqual(0)
    await phone.page.setViewportSize({ width: 390, height: 900 })
  })
})

describe('taking hold of a point', () => {
  const path = '/calculators/suspension-geometry'
  const point = (page: Page) => page.getByRole('slider', { name: 'Upper link, inner end' })
  const value = async (page: Page, key: string) =>
    Number((await field(page, 'suspension-geometry', key).inputValue()).replace('−', '-'))
  async function centre(page: Page): Promise<{ x: number; y: number }> {
    await point(page).scrollIntoViewIfNeeded()
    const box = (await point(page).locator('.knob').boundingBox())!
    return { x: box.x + box.width / 2, y: box.y + box.height / 2 }
  }

  it('moves it with the mouse, and the fields and the answer follow', async () => {
    const { page } = desk
    await open(page, path)
    const [before, answer] = [await value(page, 'upperInnerZ'), await said(page)]
    const { x, y } = await centre(page)
    await page.mouse.move(x, y)
    await page.mouse.down()
    await page.mouse.move(x + 8, y + 12, { steps: 4 })
    await page.mouse.up()
    expect(await value(page, 'upperInnerZ')).toBeLessThan(before)
    expect(await value(page, 'upperInnerY')).toBeGreaterThan(40)
    expect(await said(page)).not.toBe(answer)
    const now = await centre(page)
    expect(Math.hypot(now.x - x - 8, now.y - y - 12)).toBeLessThan(4)
  })

  it('moves it with a finger, on a place of 44 pixels', async () => {
    const { page, context } = phone
    await open(page, path)
    const hit = (await point(page).locator('.hit').boundingBox())!
    expect(Math.min(hit.width, hit.height)).toBeGreaterThanOrEqual(44)
    const before = await value(page, 'upperInnerY')
    const scrolled = await page.evaluate(() => scrollY)
    const { x, y } = await centre(page)
    const session = await context.newCDPSession(page)
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', by = 0) =>
      session.send('Input.dispatchTouchEvent', { type, touchPoints: type === 'touchEnd' ? [] : [{ x: x + by, y: y - by }] })
    await touch('touchStart')
    for (const by of [3, 6, 9, 12]) await touch('touchMove', by)
    await touch('touchEnd')
    await expect.poll(() => value(page, 'upperInnerY')).toBeGreaterThan(before)
    expect(Math.abs((await page.evaluate(() => scrollY)) - scrolled)).toBeLessThan(900)
  })

  it('moves it with the arrow keys and says where it is', async () => {
    const { page } = desk
    await open(page, path)
    await point(page).focus()
    await page.keyboard.press('ArrowUp')
    expect(await value(page, 'upperInnerZ')).toBe(63)
    await page.keyboard.press('Shift+ArrowRight')
    expect(await value(page, 'upperInnerY')).toBe(45)
    expect(await point(page).getAttribute('aria-valuetext')).toMatch(/45\smm.*63\smm/)
  })

  it('stops where there is no answer or no room, and says why', async () => {
    const { page } = desk
    await open(page, path)
    await point(page).focus()
    for (let press = 0; press < 80; press++) await page.keyboard.press('Shift+ArrowRight')
    const note = page.locator('.drw-n').first()
    await expect.poll(() => note.textContent()).not.toContain('Drag a point')
    expect(await said(page)).not.toContain('No answer')
    expect(await page.locator('main').textContent()).not.toMatch(/NaN|Infinity/)
  })

  it('goes through the travel without touching a value', async () => {
    const { page } = desk
    await open(page, path)
    const [fields, answer] = [await value(page, 'upperInnerZ'), await said(page)]
    const drawing = page.locator('.drw svg[role=img]').first()
    const still = await drawing.innerHTML()
    await page.getByLabel(/^Wheel travel/).fill('20')
    await expect.poll(() => drawing.innerHTML()).not.toBe(still)
    expect(await said(page)).toBe(answer)
    expect(await value(page, 'upperInnerZ')).toBe(fields)
    expect(await page.getByRole('slider', { name: 'Upper link, inner end' }).count()).toBe(0)
  })
})

describe('the shelf', () => {
  it('finds by plain words without JavaScript', async () => {
    const { page } = plain
    await page.goto('/calculators')
    await page.getByLabel('What do you want to know?').fill('how thick in the heat')
    await page.getByRole('button', { name: 'Find it' }).click()
    await page.waitForURL(/find=/)
    expect(await page.locator('.cl-list li:visible').count()).toBeLessThan(calculators.length)
    expect(await page.locator('.cl-list li:visible').allInnerTexts()).toEqual(
      expect.arrayContaining([expect.stringContaining('What your fluid acts like when it is hot')]),
    )
  })

  it('follows the typing and says what to do when nothing answers', async () => {
    const { page } = desk
    await page.goto('/calculators', { waitUntil: 'networkidle' })
    const shown = page.locator('.cl-list li:visible')
    const all = await shown.count()
    await page.getByLabel('What do you want to know?').fill('pinion')
    await expect.poll(() => shown.count()).toBeLessThan(4)
    await page.getByLabel('What do you want to know?').fill('xylophone')
    await expect.poll(() => page.locator('.cl-none').isVisible()).toBe(true)
    expect(await page.locator('.cl-says').textContent()).toContain('Nothing answers')
    await page.getByLabel('What do you want to know?').fill('')
    await expect.poll(() => shown.count()).toBe(all)
  })
})
