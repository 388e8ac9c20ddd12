export { cornerAnswer, evenedComparison }

import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { evened, type CornerInputs } from './wheel-loads.ts'
import type { CalculatorAnswer, CalculatorComparison } from '../definition.ts'

type Outputs = Record<
  'frontShare' | 'leftShare' | 'crossWeight' | 'cgFromFrontAxle' | 'cgFromCentreLine',
  number
>

/** Within half a per cent of even, nobody turns a collar (common practice). */
const evenEnough = 0.5
/** Under this the reading of the scales says nothing, %. */
const same = 0.05

const thisDiagonal = 'front right and rear left'
const otherDiagonal = 'front left and rear right'

function cornerAnswer(car: CornerInputs, outputs: Outputs): CalculatorAnswer {
  return { says: crossSentence(car, outputs), more: [whatToDo(outputs), sides(outputs), centre(outputs)] }
}

function crossSentence(car: CornerInputs, { crossWeight }: Outputs): Sentence {
  if (Math.abs(crossWeight - 50) < same)
    return say`Cross weight is ${mainFigure(crossWeight, '%', 3)}: both diagonals carry the same.`
  const difference = Math.abs(car.frontRight + car.rearLeft - car.frontLeft - car.rearRight)
  return say`Cross weight is ${mainFigure(crossWeight, '%', 3)}: front right and rear left together carry ${figure(difference, 'g')} ${crossWeight > 50 ? 'more' : 'less'} than the other two.`
}

function whatToDo({ crossWeight }: Outputs): Sentence {
  const off = crossWeight - 50
  if (Math.abs(off) < same) return say`Leave the spring collars where they are.`
  if (Math.abs(off) <= evenEnough)
    return say`That is within half a per cent of even. Leave it: the next weighing may differ by as much.`
  const [heavy, light] = off > 0 ? [thisDiagonal, otherDiagonal] : [otherDiagonal, thisDiagonal]
  return say`First unhook the sway bars, let the car settle and weigh again: if the difference goes, a bar or its links are tweaked. If it stays, take a quarter turn off the spring collars ${heavy} and put a quarter turn on those ${light}, until the diagonals agree. Ride height stays as it was.`
}

function sides({ leftShare, frontShare }: Outputs): Sentence {
  const shares = say`The front carries ${figure(frontShare, '%')} and the left side ${figure(leftShare, '%')}.`
  if (Math.abs(leftShare - 50) <= evenEnough) return shares
  return [
    ...shares,
    ...say` Spring collars do not change that: move the battery or ballast to the ${leftShare > 50 ? 'right' : 'left'}.`,
  ]
}

function centre({ cgFromFrontAxle, cgFromCentreLine }: Outputs): Sentence {
  const behind = say`The centre of gravity lies ${figure(cgFromFrontAxle, 'mm')} behind the front axle`
  if (Math.abs(cgFromCentreLine) < 0.05) return [...behind, ', on the centre line.']
  return [
    ...behind,
    ...say` and ${figure(Math.abs(cgFromCentreLine), 'mm', 2)} ${cgFromCentreLine > 0 ? 'left' : 'right'} of the centre line.`,
  ]
}

/** The readings now and once the collars have made the diagonals even. */
function evenedComparison(car: CornerInputs, { crossWeight }: Outputs): CalculatorComparison {
  const after = evened(car)
  const row = (label: string, key: keyof typeof after) => ({
    label: say`${label}`,
    unit: 'g' as const,
    digits: 4,
    cells: [car[key], after[key]],
  })
  const cross =
    (100 * (after.frontRight + after.rearLeft)) /
    (car.frontLeft + car.frontRight + car.rearLeft + car.rearRight)
  return {
    says: differenceInWords(car, after),
    caption: 'If the collars make the diagonals even',
    columns: ['Now', 'Even'],
    rows: [
      row('Front left', 'frontLeft'),
      row('Front right', 'frontRight'),
      row('Rear left', 'rearLeft'),
      row('Rear right', 'rearRight'),
      { label: say`Cross weight`, unit: '%', digits: 3, cells: [crossWeight, cross] },
    ],
  }
}

function differenceInWords(car: CornerInputs, after: ReturnType<typeof evened>): Sentence {
  const [front, rear] = [after.frontLeft - car.frontLeft, after.rearRight - car.rearRight]
  const total = car.frontLeft + car.frontRight + car.rearLeft + car.rearRight
  if ((100 * Math.abs(front + rear)) / total < same) return say`The diagonals are even already.`
  if (Math.min(...Object.values(after)) < 0)
    return say`No spring makes these even: one wheel would have to pull at the ground. Look for what is bent or binds.`
  const [from, to] = front > 0 ? ['right', 'left'] : ['left', 'right']
  return say`Even diagonals move ${figure(Math.abs(front), 'g', 2)} from front ${from} to front ${to}, and ${figure(Math.abs(rear), 'g', 2)} from rear ${to} to rear ${from}.`
}
