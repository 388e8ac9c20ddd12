import { createPinia } from 'pinia'
import { describe, expect, it } from 'vitest'
import { renderToString } from 'vue/server-renderer'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { createInstrumentApp } from './create-instrument-app.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import type { Derivation } from '#shared/calculators/derivation.ts'

const definitions = Object.values(
  import.meta.glob<CalculatorDefinition>('../../shared/calculators/*/index.ts', { import: 'calculator', eager: true }),
)
const derivations = import.meta.glob<Derivation>('../../shared/calculators/*/derivation.ts', {
  import: 'derivation',
  eager: true,
})

/** Those whose geometry is what the answer is about. */
const drawn = ['suspension-geometry', 'ackermann', 'anti-squat', 'hinge-pin-inserts', 'sway-bar', 'corner-weights', 'droop']
const sentences = (text: string) => text.match(/[.?!](?=\s|$)/g)?.length ?? 0

async function served(definition: CalculatorDefinition, values: Record<string, string> = {}): Promise<string> {
  const props = { slug: definition.slug, instanceId: 'c', action: '/calculators', values }
  return renderToString(await createInstrumentApp(definition, props, createPinia()))
}

describe.each(definitions.map((definition) => [definition.slug, definition] as const))('%s', (slug, definition) => {
  const run = runDefinition(definition, {})
  const started = run.ok ? run : undefined

  it('says in two sentences what it is for, where it holds and who says so', () => {
    expect(sentences(definition.purpose), definition.purpose).toBe(2)
    expect(definition.sources.length).toBeGreaterThan(0)
    for (const { text, known } of definition.sources) expect(text && known).toBeTruthy()
    expect(definition.limits.goodBetween && definition.limits.howClose).toBeTruthy()
    expect(definition.keywords.length).toBeGreaterThan(3)
  })

  it('answers its own usual values, in a sentence with one main figure', () => {
    expect(started).toBeDefined()
    const { says, more } = definition.answer(started!.inputs, started!.outputs)
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
    expect(plainSentence(says)).toMatch(/\.$/)
    expect(more.length).toBeLessThanOrEqual(3)
    expect(started!.warnings).toEqual([])
  })

  it('tells where its formula comes from', () => {
    const derivation = derivations[`../../shared/calculators/${slug}/derivation.ts`]
    expect(derivation?.steps.length).toBeGreaterThanOrEqual(3)
    if (drawn.includes(slug)) expect(derivation?.drawing).toBeDefined()
  })

  it('shows the answer as a plot, a drawing or a table, and a change in words', () => {
    const { inputs, outputs } = started!
    const at = definition.cursor?.start ?? 0
    const drawings = definition.drawings?.(inputs, outputs, at) ?? []
    const plots = definition.plots?.(inputs, outputs, at) ?? []
    const tables = definition.tables?.(inputs, outputs) ?? []
    expect(drawings.length + plots.length + tables.length).toBeGreaterThan(0)
    if (drawn.includes(slug)) expect(drawings.length).toBeGreaterThan(0)
    for (const picture of [...drawings, ...plots]) expect(plainSentence(picture.alternative)).toMatch(/\.$/)
    const comparison = definition.comparison?.(inputs, outputs)
    if (comparison !== undefined) expect(plainSentence(comparison.says)).toMatch(/\.$/)
  })

  it('has points to drag only where they move a value of the drawing’s unit', () => {
    const { inputs, outputs } = started!
    for (const { handles = [], unit } of definition.drawings?.(inputs, outputs, definition.cursor?.start ?? 0) ?? []) {
      for (const { x, y } of handles) {
        const moved = [x, y].filter((key) => key !== undefined).map((key) => definition.inputs.find((input) => input.key === key))
        expect(moved.length).toBeGreaterThan(0)
        for (const input of moved) expect(input?.unit).toBe(unit)
      }
    }
  })

  // Twice as many pages as the calculator has fields.
  it('never shows what is no number: usual values, and each field at its ends', { timeout: 60_000 }, async () => {
    const pages = [
      await served(definition),
      ...(await Promise.all(
        definition.inputs.flatMap(({ key, min, max }) => [min, max].map((end) => served(definition, { [key]: String(end) }))),
      )),
    ]
    for (const html of pages) {
      expect(html.match(/.{0,60}(NaN|undefined|Infinity|\[object).{0,20}/)?.[0]).toBeUndefined()
      expect(html).not.toMatch(/\sstyle=/)
    }
  })
})
