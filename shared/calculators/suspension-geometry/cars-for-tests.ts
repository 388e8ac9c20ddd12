export { answered, car, near, posesOf, refused, run }
export type { Inputs, Outputs }

import fc from 'fast-check'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { posesOver, travelOf, type Pose } from './curves.ts'
import { calculator } from './index.ts'
import { linkageFrom } from './linkage.ts'

type Inputs = Parameters<typeof calculator.compute>[0]
type Outputs = ReturnType<typeof calculator.compute>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Partial<Inputs>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { inputs: result.inputs as Inputs, outputs: result.outputs as Outputs, warnings: result.warnings }
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? [] : result.errors.map(({ field, message }) => `${field}: ${plainSentence(message)}`)
}
const posesOf = (inputs: Inputs): Pose[] => {
  const linkage = linkageFrom(inputs)
  return posesOver(linkage, travelOf(linkage, inputs.travelUp, inputs.travelDown))
}

const near = (middle: number, by: number) => fc.double({ min: middle - by, max: middle + by, noNaN: true })
/** Cars as they are built: each joint some millimetres from the usual place, with an answer. */
const car = fc
  .record({
    lowerInnerY: near(25, 8),
    lowerInnerZ: near(30, 6),
    lowerOuterY: near(105, 8),
    lowerOuterZ: near(28, 6),
    upperInnerY: near(40, 8),
    upperInnerZ: near(62, 6),
    upperOuterY: near(100, 8),
    upperOuterZ: near(66, 6),
    contactY: near(127.5, 15),
    tieRodInnerY: near(30, 8),
    tieRodInnerZ: near(45, 6),
    tieRodOuterY: near(102, 8),
    tieRodOuterZ: near(44, 6),
    steeringArm: fc.oneof(near(20, 5), near(-20, 5)),
    travelUp: near(15, 5),
    travelDown: near(15, 5),
  })
  .filter((values) => run(values).ok)
