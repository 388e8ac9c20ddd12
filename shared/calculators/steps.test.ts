import { describe, expect, it } from 'vitest'
import { convert } from '#shared/units/units.ts'
import { nextStep } from './steps.ts'
import type { CalculatorInput } from './definition.ts'

const wire: CalculatorInput = {
  key: 'wireDiameter',
  label: 'Wire',
  unit: 'mm',
  default: 1.6,
  min: 0.5,
  max: 4,
  reason: '',
  step: 0.1,
}
const bottle: CalculatorInput = {
  key: 'v',
  label: 'Fluid',
  unit: 'cSt',
  default: 7000,
  min: 100,
  max: 1e6,
  reason: '',
  ladder: [1000, 5000, 7000, 10000],
}

describe('nextStep', () => {
  it('goes to the next thing one can buy', () => {
    expect(nextStep(bottle, 7000, 'up', 'cSt')).toBe(10000)
    expect(nextStep(bottle, 6999, 'up', 'cSt')).toBe(7000)
    expect(nextStep(bottle, 7000, 'down', 'cSt')).toBe(5000)
  })

  it('stops at the ends of the ladder and of the range', () => {
    expect(nextStep(bottle, 10000, 'up', 'cSt')).toBeUndefined()
    expect(nextStep(wire, 4, 'up', 'mm')).toBeUndefined()
    expect(nextStep(wire, 0.5, 'down', 'mm')).toBeUndefined()
  })

  it('leads back into the range from outside it', () => {
    expect(nextStep(wire, 9, 'down', 'mm')).toBe(4)
    expect(nextStep(wire, 9, 'up', 'mm')).toBeUndefined()
    expect(nextStep(wire, 0.1, 'up', 'mm')).toBe(0.5)
  })

  it('goes to the next multiple of the step, without the crumbs of binary fractions', () => {
    expect(nextStep(wire, 1.6, 'up', 'mm')).toBe(1.7)
    expect(nextStep(wire, 1.64, 'up', 'mm')).toBe(1.7)
    expect(nextStep(wire, 1.64, 'down', 'mm')).toBe(1.6)
    expect(nextStep(wire, 0.1 + 0.2 + 0.5, 'up', 'mm')).toBe(0.9)
  })

  it('steps in round numbers of the unit that is shown', () => {
    expect(convert(nextStep(wire, 2.54, 'up', 'in') ?? NaN, 'mm', 'in')).toBeCloseTo(0.105, 9)
  })
})
