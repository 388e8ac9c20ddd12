export { carValue, enteredFor }

import type { CarKey, CarValues, EnteredCarKey } from './car-values.ts'

interface Derived {
  /** What has to be there. */
  from: readonly EnteredCarKey[]
  work(...values: number[]): number
}

const corners = ['cornerFrontLeft', 'cornerFrontRight', 'cornerRearLeft', 'cornerRearRight'] as const
const half = (value = 0) => value / 2
/** Force at the wheel per its travel, from the spring's rate and shock travel over wheel travel. */
const wheelRate = (springRate = 0, motionRatio = 0) => springRate * motionRatio ** 2

/** What follows from the entered values. Each answers only when all it needs is there. */
const derived: Partial<Record<CarKey, Derived>> = {
  mass: { from: corners, work: (...four) => sum(four) / 1000 },
  frontWeight: { from: corners, work: (...four) => (100 * sum(four.slice(0, 2))) / sum(four) },
  tyreRadius: { from: ['tyreDiameter'], work: half },
  frontContactY: { from: ['trackFront'], work: half },
  rearContactY: { from: ['trackRear'], work: half },
  frontWheelRate: { from: ['frontSpringRate', 'frontMotionRatio'], work: wheelRate },
  rearWheelRate: { from: ['rearSpringRate', 'rearMotionRatio'], work: wheelRate },
}

/**
 * What a car says about one value: the one that was entered, else what follows from others (the weight from
 * four scales, the wheel rate from spring and motion ratio), else undefined.
 */
function carValue(car: CarValues, key: CarKey): number | undefined {
  const entered = valueIn(car, key)
  const rule = derived[key]
  if (entered !== undefined || rule === undefined) return entered
  const known = rule.from.flatMap((part) => valueIn(car, part) ?? [])
  return known.length === rule.from.length ? rule.work(...known) : undefined
}

/** What one enters so that a car can answer `key`: the value itself, or those it follows from. */
function enteredFor(key: CarKey): readonly EnteredCarKey[] {
  const own = key === 'mass' || key === 'frontWeight' ? undefined : derived[key]
  return own?.from ?? [key as EnteredCarKey]
}

// Own members only: what a browser kept may be any JSON.
function valueIn(car: CarValues, key: CarKey): number | undefined {
  return Object.hasOwn(car, key) ? (car as Partial<Record<string, number>>)[key] : undefined
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0)
}
