export { CAR_RULES }

import { figure, say, type Sentence } from '#shared/calculators/sentence.ts'
import type { CarValues, EnteredCarKey } from './car-values.ts'

type Rule = (car: CarValues) => { key: EnteredCarKey; message: Sentence } | undefined

// A kitchen scale and four small ones seldom agree better than within a few per cent.
const SCALES_AGREE = 0.05
const FRONT_SHARES_AGREE = 5

const ENDS = ['front', 'rear'] as const
const mm = (value: number) => figure(value, 'mm', 4)

/** Holds only where all of the values are there. */
function together<Key extends EnteredCarKey>(
  keys: readonly Key[],
  judge: (values: Record<Key, number>) => { key: Key; message: Sentence } | undefined,
): Rule {
  return (car) => (keys.every((key) => car[key] !== undefined) ? judge(car as Record<Key, number>) : undefined)
}

/** `bigger` has to be more than `smaller`. */
function more(bigger: EnteredCarKey, smaller: EnteredCarKey, says: (bigger: number, smaller: number) => Sentence): Rule {
  return together([bigger, smaller], (car) =>
    car[bigger] > car[smaller] ? undefined : { key: bigger, message: says(car[bigger], car[smaller]) },
  )
}

const corners = ['cornerFrontLeft', 'cornerFrontRight', 'cornerRearLeft', 'cornerRearRight'] as const

const weights: Rule[] = [
  together(['mass', ...corners], (car) => {
    const four = corners.reduce((total, key) => total + car[key], 0) / 1000
    return Math.abs(four - car.mass) <= SCALES_AGREE * car.mass
      ? undefined
      : {
          key: 'mass',
          message: say`The four scales together say ${figure(four, 'kg', 4)}, the whole car ${figure(car.mass, 'kg', 4)}. More than 5 % apart is more than a scale is out: weigh again.`,
        }
  }),
  (car) => {
    const known = corners.flatMap((key) => car[key] ?? [])
    const some = known.reduce((total, grams) => total + grams, 0) / 1000
    if (car.mass === undefined || known.length === corners.length || some <= car.mass * (1 + SCALES_AGREE)) return undefined
    return { key: 'mass', message: say`${String(known.length)} of the four scales already say ${figure(some, 'kg', 4)}, more than the whole car.` }
  },
  together(['frontWeight', ...corners], (car) => {
    const front = car.cornerFrontLeft + car.cornerFrontRight
    const share = (100 * front) / (front + car.cornerRearLeft + car.cornerRearRight)
    return Math.abs(share - car.frontWeight) <= FRONT_SHARES_AGREE
      ? undefined
      : {
          key: 'frontWeight',
          message: say`The four scales say ${figure(share, '%')} on the front wheels, this says ${figure(car.frontWeight, '%')}. Leave one of the two out, or weigh again.`,
        }
  }),
  together(['mass', 'frontSprungMass', 'rearSprungMass'], (car) => {
    const sprung = 2 * (car.frontSprungMass + car.rearSprungMass)
    return sprung <= car.mass
      ? undefined
      : { key: 'mass', message: say`The sprung weight of all four wheels comes to ${figure(sprung, 'kg', 4)}, more than the whole car.` }
  }),
]

const wheels: Rule[] = [
  more('tyreDiameter', 'rimDiameter', (tyre, rim) => say`A tyre of ${mm(tyre)} does not go over a rim of ${mm(rim)}.`),
  more('trackFront', 'kingpinSpacing', (track, pivots) => say`The steering pivots stand ${mm(pivots)} apart, so a front track of ${mm(track)} puts them outside the tyres.`),
]

const bothEnds: Rule[] = ENDS.flatMap((end) => [
  more(`${end}SpringOutside`, `${end}SpringWire`, (outside, wire) => say`A coil of ${mm(wire)} wire is wider than ${mm(outside)}: measure the outside across the coils.`),
  together([`${end}SpringOutside`, `${end}SpringWire`], (car) => {
    const [outside, wire] = [car[`${end}SpringOutside`], car[`${end}SpringWire`]]
    return outside <= wire || outside > 2 * wire
      ? undefined
      : { key: `${end}SpringOutside`, message: say`A coil of ${mm(wire)} wire with an outside of ${mm(outside)} leaves no hole in the middle.` }
  }),
  more(`${end}ShockBore`, `${end}ShockRod`, (bore, rod) => say`A rod of ${mm(rod)} does not go into a bore of ${mm(bore)}.`),
  together([`${end}ShockBore`, `${end}ShockRod`, `${end}PistonHoleDiameter`], (car) => {
    const room = (car[`${end}ShockBore`] - car[`${end}ShockRod`]) / 2
    return room <= 0 || car[`${end}PistonHoleDiameter`] < room
      ? undefined
      : { key: `${end}PistonHoleDiameter`, message: say`Between rod and bore there are ${mm(room)}, too little for a hole of ${mm(car[`${end}PistonHoleDiameter`])}.` }
  }),
  more(`${end}ArmLength`, `${end}DroopScrewRadius`, (arm, screw) => say`The droop screw cannot stand ${mm(screw)} out on an arm of ${mm(arm)}.`),
  ...(['LowerInner/LowerOuter/lower arm’s outer pin', 'UpperInner/UpperOuter/upper link’s outer end', 'TieRodInner/TieRodOuter/tie rod’s outer end'] as const).map((line) => {
    const [inner, outer, name] = line.split('/') as [string, string, string]
    return more(`${end}${outer}Y` as EnteredCarKey, `${end}${inner}Y` as EnteredCarKey, (out, within) =>
      say`The ${name} stands ${mm(out)} from the middle of the car, not further out than the inner one at ${mm(within)}.`)
  }),
  more(`${end}UpperOuterZ`, `${end}LowerOuterZ`, (upper, lower) => say`The upper link’s outer end stands ${mm(upper)} up, not higher than the lower arm’s at ${mm(lower)}.`),
])

/** What a car cannot be, whatever a scale or a caliper said. Only what is impossible is refused; what is unusual is not. */
const CAR_RULES: readonly Rule[] = [...weights, ...wheels, ...bothEnds]
