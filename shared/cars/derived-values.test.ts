import { expect, it } from 'vitest'
import { carValues, type CarKey } from './car-values.ts'
import { carValue, enteredFor } from './derived-values.ts'

const corners = { cornerFrontLeft: 850, cornerFrontRight: 870, cornerRearLeft: 950, cornerRearRight: 930 }

it.each<[string, object, CarKey, number | undefined]>([
  ['what was entered', { mass: 3.5, ...corners }, 'mass', 3.5],
  ['the weight from four scales', corners, 'mass', 3.6],
  ['nothing from three scales', { ...corners, cornerRearRight: undefined }, 'mass', undefined],
  ['the front share from four scales', corners, 'frontWeight', (100 * 1720) / 3600],
  ['half a tyre', { tyreDiameter: 115 }, 'tyreRadius', 57.5],
  ['half a track', { trackRear: 255 }, 'rearContactY', 127.5],
  ['the wheel rate from spring and motion ratio', { rearSpringRate: 0.8, rearMotionRatio: 0.5 }, 'rearWheelRate', 0.2],
  ['no wheel rate from a spring alone', { rearSpringRate: 0.8 }, 'rearWheelRate', undefined],
  ['an angle of zero', { frontToe: 0 }, 'frontToe', 0],
])('a car says %s', (_what, car, key, value) => {
  const answer = carValue(JSON.parse(JSON.stringify(car)), key)
  if (value === undefined) expect(answer).toBeUndefined()
  else expect(answer).toBeCloseTo(value, 12)
})

it('names what one enters for everything that a calculator may ask for', () => {
  const known = new Set<string>(carValues.map(({ key }) => key))
  for (const key of ['mass', 'tyreRadius', 'frontContactY', 'rearWheelRate', 'wheelbase'] as const) {
    expect(enteredFor(key).every((part) => known.has(part))).toBe(true)
  }
  expect(enteredFor('rearWheelRate')).toEqual(['rearSpringRate', 'rearMotionRatio'])
})
