import { describe, expect, it } from 'vitest'
import { NoAnswerError } from '#shared/calculators/run-definition.ts'
import { plainSentence, say } from '#shared/calculators/sentence.ts'
import { movedValues, saidOf, stepOf, type Grip } from './move-handle.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

const input = (key: string, label: string) =>
  ({ key, label, unit: 'mm', default: 30, min: 0, max: 100, reason: 'no arm is longer' }) as const
const definition: CalculatorDefinition = {
  slug: 'arm',
  title: 'Arm',
  purpose: '',
  part: 'wheel angles',
  keywords: [],
  inputs: [input('across', 'Outer pin, out'), input('up', 'Outer pin, up')],
  outputs: [],
  compute({ up }) {
    if (up === 13) throw new NoAnswerError('up', say`The arm binds there.`)
    return {}
  },
  warnings: () => [],
  answer: () => ({ says: [], more: [] }),
  working: () => ({ steps: [], symbols: [] }),
  limits: { goodBetween: '', howClose: '' },
  sources: [],
  cautions: [],
}
const grip: Grip = { definition, inputs: { across: 80, up: 30 }, set: () => {} }
const both = { at: [80, 30], label: 'Outer pin', x: 'across', y: 'up' } as const
const stopped = (x: number, y: number) => plainSentence(movedValues(grip, both, x, y).stopped ?? []).replaceAll('\u00A0', ' ')

describe('moving a point', () => {
  it('moves both values', () => {
    expect(movedValues(grip, both, 81.5, 29)).toEqual({ values: { across: 81.5, up: 29 }, stopped: undefined })
  })

  it('moves only the value a point has', () => {
    expect(movedValues(grip, { at: [80, 30], label: 'Pin', y: 'up' }, 5, 29).values).toEqual({ up: 29 })
  })

  it('stops at the range and says so', () => {
    expect(movedValues(grip, both, 140, 29).values).toEqual({ across: 100, up: 29 })
    expect(stopped(140, 29)).toBe('Outer pin, out stops at 100 mm: no arm is longer.')
    expect(stopped(80, -3)).toBe('Outer pin, up stops at 0 mm: no arm is longer.')
  })

  it('stays where it was when there is no answer, and says why', () => {
    expect(movedValues(grip, both, 80, 13).values).toBeUndefined()
    expect(stopped(80, 13)).toBe('The arm binds there.')
  })

  it('leaves no tails of sums of steps', () => {
    expect(movedValues(grip, both, 0.1 + 0.2, 30).values?.across).toBe(0.3)
  })

  it('steps round in the reader’s unit', () => {
    expect(stepOf('mm', {}, 'arrow')).toBe(1)
    expect(stepOf('mm', {}, 'shift')).toBe(5)
    expect(stepOf('mm', { length: 'in' }, 'arrow')).toBeCloseTo(0.05 * 25.4, 12)
  })

  it('says in words where it is', () => {
    expect(saidOf(grip, both, {}).replaceAll('\u00A0', ' ')).toBe('Outer pin, out 80 mm, Outer pin, up 30 mm')
  })
})
