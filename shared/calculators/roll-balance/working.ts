export { balanceWorking }

import { fenced, frac, math, num, power, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { standardGravity as gravity } from '../common/standard-gravity.ts'
import { rollBalance, type BalanceValues } from './balance.ts'
import type { CalculatorWorking, WorkingStep } from '../definition.ts'

type Outputs = Record<
  | 'rollStiffnessFront'
  | 'rollStiffnessRear'
  | 'rollAngle'
  | 'loadTransferFront'
  | 'loadTransferRear'
  | 'frontShare'
  | 'insideLoadFront'
  | 'insideLoadRear',
  number
>

const at = (letter: string, end: string) => sub(letter, end)
const metres = (millimetres: number) => num(millimetres / 1000, 6)

function balanceWorking(values: BalanceValues, outputs: Outputs): CalculatorWorking {
  const { mass, frontWeight, cgHeight, rollCentreFront, rollCentreRear, lateralAcceleration } = values
  const { lever, front, rear } = rollBalance(values)
  const radians = (perDegree: number) => (perDegree * 180) / Math.PI
  const [stiffFront, stiffRear] = [radians(outputs.rollStiffnessFront), radians(outputs.rollStiffnessRear)]
  const sideways = num(lateralAcceleration * gravity, 5)
  const share = num(frontWeight / 100, 5)
  const angle = num((outputs.rollAngle * Math.PI) / 180, 5)
  const body = (m: MathPart, a: MathPart, h: MathPart) => row(m, '×', a, '×', h)

  const stiffnessOf = (
    end: 'front' | 'rear',
    wheel: number,
    bar: number,
    track: number,
    result: number,
  ): WorkingStep => {
    const law = (rates: MathPart, width: MathPart) => frac(row(rates, '×', power(width, '2')), '2')
    return {
      title: `Roll stiffness of the ${end}, rates in N/m, track in m; shown for each degree`,
      formula: math(at('K', end), '=', law(fenced(at('k', 'wheel'), '+', at('k', 'bar')), 't')),
      numbers: math(
        at('K', end),
        '=',
        law(fenced(num(wheel * 1000, 6), '+', num(bar * 1000, 6)), metres(track)),
      ),
      result: figure(result, 'N·m/deg', 4),
    }
  }
  const movedOf = (
    end: 'front' | 'rear',
    stiff: number,
    weight: number,
    rollCentre: number,
    track: number,
    result: number,
  ): WorkingStep => {
    const law = (k: MathPart, phi: MathPart, m: MathPart, a: MathPart, h: MathPart, width: MathPart) =>
      frac(row(k, '×', phi, '+', m, '×', a, '×', h), width)
    return {
      title: `What moves across at the ${end}: through springs and bars, and through the arms`,
      formula: math(
        at('ΔF', end),
        '=',
        law(at('K', end), 'φ', at('m', end), 'a', at('h', end), at('t', end)),
      ),
      numbers: math(
        at('ΔF', end),
        '=',
        law(num(stiff, 5), angle, num(weight, 5), sideways, metres(rollCentre), metres(track)),
      ),
      result: figure(result, 'N', 4),
    }
  }
  const insideOf = (end: 'front' | 'rear', weight: number, moved: number, result: number): WorkingStep => ({
    title: `Load left on the inside ${end} wheel`,
    formula: math(at('F', end), '=', frac(row(at('m', end), '×', 'g'), '2'), '−', at('ΔF', end)),
    numbers: math(at('F', end), '=', frac(row(num(weight, 5), '×', num(gravity, 6)), '2'), '−', num(moved)),
    result: figure(result, 'N', 4),
  })
  const massFront = (mass * frontWeight) / 100
  const massRear = mass - massFront
  return {
    symbols: [
      {
        symbol: math('m'),
        means: say`weight of the car, ${figure(mass, 'kg', 6)}, of which ${figure(frontWeight, '%', 4)} in front`,
      },
      { symbol: math('a'), means: say`side acceleration, ${figure(lateralAcceleration, 'g0', 4)} in m/s²` },
      {
        symbol: math('h'),
        means: say`height of the centre of gravity, ${figure(cgHeight, 'mm', 4)}; with an index, of that roll centre`,
      },
      { symbol: math('h′'), means: say`lever from the roll axis up to the centre of gravity` },
      { symbol: math('K'), means: say`roll stiffness of an axle` },
      { symbol: math('φ'), means: say`angle of lean, in radians in the formulas` },
    ],
    steps: [
      {
        title: 'Lever: height above the line between the roll centres',
        formula: math(
          'h′',
          '=',
          'h',
          '−',
          fenced(
            at('h', 'front'),
            '×',
            at('w', 'front'),
            '+',
            at('h', 'rear'),
            '×',
            fenced('1', '−', at('w', 'front')),
          ),
        ),
        numbers: math(
          'h′',
          '=',
          num(cgHeight, 6),
          '−',
          fenced(
            num(rollCentreFront, 6),
            '×',
            share,
            '+',
            num(rollCentreRear, 6),
            '×',
            fenced('1', '−', share),
          ),
        ),
        result: figure(lever, 'mm', 4),
      },
      stiffnessOf(
        'front',
        values.wheelRateFront,
        values.barRateFront,
        values.trackFront,
        outputs.rollStiffnessFront,
      ),
      stiffnessOf(
        'rear',
        values.wheelRateRear,
        values.barRateRear,
        values.trackRear,
        outputs.rollStiffnessRear,
      ),
      {
        title: 'Lean: the side force tips, the weight tips further, springs and bars hold',
        formula: math(
          'φ',
          '=',
          frac(body('m', 'a', 'h′'), row(at('K', 'front'), '+', at('K', 'rear'), '−', body('m', 'g', 'h′'))),
        ),
        numbers: math(
          'φ',
          '=',
          frac(
            body(num(mass, 6), sideways, metres(lever)),
            row(
              num(stiffFront, 5),
              '+',
              num(stiffRear, 5),
              '−',
              body(num(mass, 6), num(gravity, 6), metres(lever)),
            ),
          ),
        ),
        result: figure(outputs.rollAngle, 'deg', 4),
      },
      movedOf('front', stiffFront, massFront, rollCentreFront, values.trackFront, outputs.loadTransferFront),
      movedOf('rear', stiffRear, massRear, rollCentreRear, values.trackRear, outputs.loadTransferRear),
      {
        title: 'Share of the front',
        formula: math('s', '=', frac(at('ΔF', 'front'), row(at('ΔF', 'front'), '+', at('ΔF', 'rear')))),
        numbers: math('s', '=', frac(num(front.moved), row(num(front.moved), '+', num(rear.moved)))),
        result: figure(outputs.frontShare, '%', 4),
      },
      insideOf('front', massFront, front.moved, outputs.insideLoadFront),
      insideOf('rear', massRear, rear.moved, outputs.insideLoadRear),
    ],
  }
}
