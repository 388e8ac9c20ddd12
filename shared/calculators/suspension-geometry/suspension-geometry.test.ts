import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { answered, posesOf, refused, type Inputs } from './cars-for-tests.ts'
import { calculator } from './index.ts'

describe('suspension-geometry', () => {
  it.each([
    [
      { travelUp: 150, steeringArm: 100 },
      /^travelUp: The linkage binds at [\d.]+\u00A0mm of travel up: beyond that the arms cannot follow\. Ask for less travel, or move a point\.$/,
    ],
    [
      { travelDown: 150, steeringArm: 100 },
      /^travelDown: The linkage binds at [\d.]+\u00A0mm of travel down: beyond/,
    ],
    [
      { tieRodOuterY: 45, tieRodInnerY: 38, travelUp: 30 },
      /^travelUp: The tie rod binds at 10\.4\u00A0mm of travel up: beyond that it cannot reach the upright\./,
    ],
    [{ upperInnerY: 105, upperInnerZ: 28 }, /^travelUp: The linkage binds at 0\u00A0mm/],
  ])('says where %j binds', (values, words) => {
    expect(refused(values)[0]).toMatch(words)
  })

  it.each([
    [
      { lowerOuterY: 25, lowerOuterZ: 30 },
      'lowerOuterY: The ends of the lower arm must be at least 1\u00A0mm apart.',
    ],
    [
      { upperOuterY: 40, upperOuterZ: 62 },
      'upperOuterY: The ends of the upper link must be at least 1\u00A0mm apart.',
    ],
    [
      { upperOuterY: 105, upperOuterZ: 28 },
      'upperOuterZ: The two outer joints must be at least 1\u00A0mm apart: the upright is held between them.',
    ],
    [
      { tieRodOuterY: 30 },
      'tieRodOuterY: The ends of the tie rod must be at least 1\u00A0mm apart sideways: an upright rod does not steer.',
    ],
    [
      { steeringArm: 0 },
      'steeringArm: The steering arm must be at least 1\u00A0mm long, in front (plus) or behind (minus): without one a rod cannot hold the wheel.',
    ],
    [
      { contactY: 0 },
      'contactY: Middle of the tyre: out must be between 5\u00A0mm and 1,000\u00A0mm: that is half the track, from the smallest model to a full-size car.',
    ],
    [
      { upperInnerZ: 1001 },
      'upperInnerZ: Upper link, inner end: up must be between −200\u00A0mm and 1,000\u00A0mm: that is the range from the smallest model to a full-size car.',
    ],
    [
      { travelUp: 0 },
      'travelUp: Travel up must be between 1\u00A0mm and 300\u00A0mm: the curves need some travel to run over, and no such car has more.',
    ],
    [
      { tieRodInnerZ: NaN },
      'tieRodInnerZ: Tie rod, inner end: up must be a number, between −200\u00A0mm and 1,000\u00A0mm.',
    ],
    [
      {
        lowerInnerY: 50,
        lowerInnerZ: 30,
        lowerOuterY: 100,
        lowerOuterZ: 30,
        upperInnerY: 50,
        upperInnerZ: 80,
        upperOuterY: 75,
        upperOuterZ: 55,
        contactY: 100,
      },
      'contactY: With these points the wheel cannot rise or fall: the instant centre stands straight above or below the tyre, or the two arms lie on one line.',
    ],
  ])('refuses %j with its reason', (values, words) => {
    expect(refused(values)).toContain(words)
  })

  it.each([
    [{}, []],
    [{ tieRodOuterZ: 55 }, ['tieRodOuterZ']],
    [
      { lowerInnerZ: 62, lowerOuterZ: 66, upperInnerZ: 30, upperOuterZ: 28, travelUp: 5, travelDown: 5 },
      ['upperOuterZ'],
    ],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says roll centre and camber gain first, then where the lines meet and what the travel does', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe(
      'The roll centre stands 11.1\u00A0mm above the ground, and the top of the wheel tips in by 0.13\u00A0°/mm of bump.',
    )
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
    expect(more.map((sentence) => plainSentence(sentence))).toEqual([
      'The lines of the arms meet 313\u00A0mm past the centre line, 38.5\u00A0mm above the ground. The wheel steers towards toe-out by 0.074\u00A0°/mm of bump.',
      'From full droop to full bump, camber runs from 1.6° to −4.9°, toe from 1.4° to −2.3°, counted from ride height.',
      'On the way the roll centre goes from 35.5\u00A0mm to −15.2\u00A0mm, minus meaning below the ground.',
    ])
  })

  it('says what the next hole does', () => {
    const says = (values: Partial<Inputs>) => {
      const { inputs, outputs } = answered(values)
      return plainSentence(calculator.comparison!(inputs, outputs).says)
    }
    expect(says({})).toBe(
      '2\u00A0mm higher at the upper link’s inner end lowers the roll centre by 2.8\u00A0mm.',
    )
    expect(says({ upperInnerY: 120, upperInnerZ: 90, contactY: 200 })).toBe(
      '2\u00A0mm higher at the upper link’s inner end raises the roll centre by 0.71\u00A0mm.',
    )
  })

  it('lists the ends of the travel as its poses are', () => {
    const { inputs, outputs } = answered({})
    const [table] = calculator.tables!(inputs, outputs)
    const [first, last] = [posesOf(inputs).at(0), posesOf(inputs).at(-1)]
    expect(table?.rows.map(({ cells }) => cells[0])).toEqual([
      -20,
      first?.camber,
      first?.toe,
      first?.rollCentre,
      first?.track,
    ])
    expect(table?.rows.map(({ cells }) => cells[4])).toEqual([
      25,
      last?.camber,
      last?.toe,
      last?.rollCentre,
      last?.track,
    ])
  })
})
