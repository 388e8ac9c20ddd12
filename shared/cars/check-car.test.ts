import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { carValues, type CarValues } from './car-values.ts'
import { checkCar } from './check-car.ts'

const says = (values: object) => checkCar(values as CarValues).map(({ key, message }) => `${key}: ${plainSentence(message).replaceAll('\u00A0', ' ')}`)

describe('what a car cannot be', () => {
  it.each([
    [{ frontWeight: 140 }, 'frontWeight: Weight on the front wheels must be between 20 % and 80 %.'],
    [{ spurTeeth: 46.5 }, 'spurTeeth: Teeth of the spur gear must be a whole number.'],
    [{ mass: NaN }, 'mass: Weight of the whole car must be a number, between 0.5 kg and 12 kg.'],
    [{ mass: '3' }, 'mass: Weight of the whole car must be a number, between 0.5 kg and 12 kg.'],
    [{ wings: 2 }, 'wings: “wings” is no value of a car.'],
    [
      { mass: 3.6, cornerFrontLeft: 700, cornerFrontRight: 700, cornerRearLeft: 700, cornerRearRight: 700 },
      'mass: The four scales together say 2.8 kg, the whole car 3.6 kg. More than 5 % apart is more than a scale is out: weigh again.',
    ],
    [{ mass: 1.5, cornerFrontLeft: 850, cornerFrontRight: 850 }, 'mass: 2 of the four scales already say 1.7 kg, more than the whole car.'],
    [
      { frontWeight: 60, cornerFrontLeft: 800, cornerFrontRight: 800, cornerRearLeft: 1000, cornerRearRight: 1000 },
      'frontWeight: The four scales say 44.4 % on the front wheels, this says 60 %. Leave one of the two out, or weigh again.',
    ],
    [{ tyreDiameter: 80, rimDiameter: 83 }, 'tyreDiameter: A tyre of 80 mm does not go over a rim of 83 mm.'],
    [{ rearShockBore: 3, rearShockRod: 3.5 }, 'rearShockBore: A rod of 3.5 mm does not go into a bore of 3 mm.'],
    [{ frontShockBore: 16, frontShockRod: 3.5, frontPistonHoleDiameter: 7 }, 'frontPistonHoleDiameter: Between rod and bore there are 6.25 mm, too little for a hole of 7 mm.'],
    [{ frontSpringOutside: 5, frontSpringWire: 3 }, 'frontSpringOutside: A coil of 3 mm wire with an outside of 5 mm leaves no hole in the middle.'],
    [
      { frontLowerInnerY: 105, frontLowerOuterY: 25 },
      'frontLowerOuterY: The lower arm’s outer pin stands 25 mm from the middle of the car, not further out than the inner one at 105 mm.',
    ],
    [{ rearArmLength: 80, rearDroopScrewRadius: 90 }, 'rearArmLength: The droop screw cannot stand 90 mm out on an arm of 80 mm.'],
    [{ trackFront: 200, kingpinSpacing: 210 }, 'trackFront: The steering pivots stand 210 mm apart, so a front track of 200 mm puts them outside the tyres.'],
    [{ mass: 3, frontSprungMass: 1, rearSprungMass: 1 }, 'mass: The sprung weight of all four wheels comes to 4 kg, more than the whole car.'],
  ])('%j', (values, sentence) => {
    expect(says(values)).toEqual([sentence])
  })

  it('a car in which nothing was measured is no problem, and neither is a good one', () => {
    expect(checkCar({})).toEqual([])
    expect(says({ mass: 3.6, cornerFrontLeft: 850, cornerFrontRight: 850, cornerRearLeft: 950, cornerRearRight: 950, frontWeight: 48, tyreDiameter: 115, rimDiameter: 83 })).toEqual([])
  })

  it('says nothing about values that are not there: leaving one out never makes a problem', () => {
    const any = fc.record(
      Object.fromEntries(carValues.map(({ key, min, max, ...entry }) => [key, 'whole' in entry ? fc.integer({ min, max }) : fc.double({ min, max, noNaN: true })])),
      { requiredKeys: [] },
    )
    fc.assert(
      fc.property(any, fc.nat(), (car, pick) => {
        const problems = checkCar(car as CarValues)
        const keys = Object.keys(car)
        const { [keys[pick % Math.max(1, keys.length)] ?? '']: _out, ...less } = car as Record<string, number>
        const before = new Set(problems.map(({ key }) => key))
        // Four scales that become three may say more than the whole car by another sentence, at the same value.
        for (const { key } of checkCar(less as CarValues)) expect(before).toContain(key)
      }),
    )
  })
})

describe('the list of values', () => {
  it('has each key once, a range that is one, and help that ends', () => {
    expect(new Set(carValues.map(({ key }) => key)).size).toBe(carValues.length)
    for (const { min, max, help } of carValues) {
      expect(min).toBeLessThan(max)
      expect(help).toMatch(/\.$/)
    }
  })
})
