export { carMass, cgHeight, frontWeight, wheelbase }

import { carRanges } from '#shared/cars/car-ranges.ts'
import type { CalculatorInput } from '../definition.ts'

/** Inputs about the whole car that several calculators ask for, with the ranges of “my car”. */

const carMass = {
  key: 'mass',
  label: 'Weight of the whole car',
  unit: 'kg',
  default: 3.6,
  min: carRanges.mass[0],
  max: carRanges.mass[1],
  step: 0.1,
  reason: 'this is made for cars that one person lifts with one hand',
  help: 'Ready to race, with battery, body and wing.',
  carKey: 'mass',
} as const satisfies CalculatorInput

const frontWeight = {
  key: 'frontWeight',
  label: 'Weight on the front wheels',
  unit: '%',
  default: 48,
  min: carRanges.frontWeight[0],
  max: carRanges.frontWeight[1],
  step: 0.5,
  reason: 'a car with less at one end lifts that end as soon as it accelerates or brakes',
  help: 'Front wheels on a scale, rear wheels on a block as high; divide by the whole weight.',
  carKey: 'frontWeight',
} as const satisfies CalculatorInput

const wheelbase = {
  key: 'wheelbase',
  label: 'Wheelbase',
  unit: 'mm',
  default: 325,
  min: carRanges.wheelbase[0],
  max: carRanges.wheelbase[1],
  step: 1,
  reason: 'R/C cars are not built shorter or longer than that',
  help: 'Middle of the front axle to middle of the rear axle, on the same side.',
  carKey: 'wheelbase',
} as const satisfies CalculatorInput

const cgHeight = {
  key: 'cgHeight',
  label: 'Height of the centre of gravity',
  unit: 'mm',
  default: 45,
  min: carRanges.cgHeight[0],
  max: carRanges.cgHeight[1],
  step: 1,
  reason: 'lower it would lie in the chassis plate, higher the car would roll over',
  help: 'From the ground. 40 to 50\u00A0mm suits a 1/8 buggy as a start (common practice). To measure it: “How high your car’s centre of gravity is”.',
  carKey: 'cgHeight',
} as const satisfies CalculatorInput
