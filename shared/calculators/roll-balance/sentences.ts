export { balanceAnswer, goesBothWays }

import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { rollBalance, type BalanceValues } from './balance.ts'
import type { CalculatorAnswer } from '../definition.ts'

type Outputs = Record<'frontShare' | 'rollAngle' | 'loadTransferFront' | 'loadTransferRear', number>

/** The answer in words; a wheel that lifts comes before everything else. */
function balanceAnswer(values: BalanceValues, outputs: Outputs): CalculatorAnswer {
  const { front, rear, rollsAt } = rollBalance(values)
  const { lateralAcceleration: asked, frontWeight } = values
  const share = say`the front tyres take ${figure(outputs.frontShare, '%')} of what moves from the inside to the outside`
  const moved = figure(outputs.loadTransferFront + outputs.loadTransferRear, 'N')
  const lean = say`The car leans ${figure(outputs.rollAngle, 'deg', 2)} and ${moved} moves across in all.`
  if (asked >= rollsAt) {
    return {
      says: say`Both inside wheels lift at ${figure(asked, 'g0')}: the car rolls over, from about ${mainFigure(rollsAt, 'g0')} on.`,
      more: [
        say`A lower centre of gravity or a wider track puts that off; springs and bars only shift which wheel lifts first.`,
      ],
    }
  }
  if (front.inside < 0 || rear.inside < 0) {
    const [end, other, lifts] = front.inside < 0 ? ['front', 'rear', front] : ['rear', 'front', rear]
    return {
      says: say`The inside ${end} wheel lifts: it carries nothing from ${mainFigure(lifts.liftsAt, 'g0')} on, and you asked for ${figure(asked, 'g0')}.`,
      more: [
        say`Beyond that the ${other} end has to take the rest, so the loads below no longer hold. The car goes over from about ${figure(rollsAt, 'g0')} on.`,
        ...(goesBothWays(outputs) ? [] : [[...say`Up to there `, ...share, '.']]),
      ],
    }
  }
  if (goesBothWays(outputs)) {
    const end = outputs.loadTransferFront <= 0 ? 'front' : 'rear'
    return {
      says: say`The ${end} end moves no load outwards in this corner: with these roll centres the other end moves more than all of it, ${mainFigure(outputs.loadTransferFront + outputs.loadTransferRear, 'N')} together.`,
      more: [say`A share of such a sum means nothing. Check both roll centres: one lies far above the centre of gravity or below the ground.`, liftsFirst(front.liftsAt, rear.liftsAt)],
    }
  }
  return {
    says: [
      ...say`In a corner of ${figure(asked, 'g0')} the front tyres take `,
      mainFigure(outputs.frontShare, '%'),
      ' of what moves from the inside to the outside.',
    ],
    more: [lean, favours(outputs.frontShare, frontWeight), liftsFirst(front.liftsAt, rear.liftsAt)],
  }
}

/** Whether one end moves load inwards, or none: then the front's share lies outside 0 to 100 %. */
function goesBothWays({ loadTransferFront, loadTransferRear }: Pick<Outputs, 'loadTransferFront' | 'loadTransferRear'>): boolean {
  return loadTransferFront <= 0 || loadTransferRear <= 0
}

/** A tyre gains less grip from load than it loses without it, so the end that moves more of it has less left. */
function favours(frontShare: number, frontWeight: number): Sentence {
  const weight = figure(frontWeight, '%')
  if (frontShare > frontWeight + 1)
    return say`That is more than its ${weight} of the weight: the front gives up grip first, and the car pushes more.`
  if (frontShare < frontWeight - 1)
    return say`That is less than its ${weight} of the weight: the rear gives up grip first, and the car turns in harder.`
  return say`That is about its ${weight} of the weight, so neither end is asked to give up grip first.`
}

function liftsFirst(front: number, rear: number): Sentence {
  const first = Math.min(front, rear)
  if (!Number.isFinite(first)) return say`No inside wheel would lift however hard the corner.`
  return say`The first wheel to lift would be the inside ${front <= rear ? 'front' : 'rear'}, at ${figure(first, 'g0')}.`
}
