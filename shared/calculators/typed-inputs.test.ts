import { describe, expect, it } from 'vitest'
import { calculator } from './fluid-temperature/index.ts'
import { calculator as gearing } from './gearing/index.ts'
import { linkQuery, parametersFor } from './query.ts'
import { plainSentence } from './sentence.ts'
import { readTypedInputs } from './typed-inputs.ts'

describe('readTypedInputs', () => {
  it('reads a number in the unit that stands beside its field', () => {
    expect(
      readTypedInputs(calculator, { viscosityAt25: '7,000', temperature: '131' }, { temperature: '°F' }),
    ).toEqual({
      values: { viscosityAt25: 7000, temperature: 55 },
      errors: [],
    })
  })

  it('says at the field what to type, in the reader’s units', () => {
    const { values, errors } = readTypedInputs(
      calculator,
      { viscosityAt25: 'thick', temperature: '', referenceTemperature: '20 mm' },
      {},
    )
    expect(values).toEqual({})
    expect(errors.map(({ message }) => plainSentence(message, { temperature: '°F' }))).toEqual([
      'Type fluid on the bottle as a number, between 0.5\u00A0cSt and 10,000,000\u00A0cSt.',
      'Temperature it felt right at is measured in °C; give it in that unit.',
      'Fill in temperature now, between −13\u00A0°F and 212\u00A0°F.',
    ])
  })
})

it('asks for a bare number where the field has no unit', () => {
  const { errors } = readTypedInputs(gearing, { spurTeeth: '3/32 in' }, {})
  expect(errors.map(({ message }) => plainSentence(message))).toEqual([
    `${gearing.inputs[0]?.label ?? ''} is a plain number: leave the unit out.`,
  ])
})

describe('links', () => {
  it('carry every number in the calculator’s own units and are read back', () => {
    const query = linkQuery(calculator, 'heat', {
      viscosityAt25: 7000,
      referenceTemperature: 25,
      temperature: 55.5,
    })
    expect(query).toBe('heat.viscosityAt25=7000&heat.referenceTemperature=25&heat.temperature=55.5')
    const read = parametersFor(
      Object.fromEntries(new URLSearchParams(`${query}&other.temperature=3`)),
      'heat',
    )
    expect(read).toEqual({ viscosityAt25: '7000', referenceTemperature: '25', temperature: '55.5' })
  })

  it('say which end of the car they are about, where there is a choice', () => {
    expect(linkQuery(calculator, 'heat', { temperature: 55 }, 'rear')).toBe('heat.temperature=55&heat.end=rear')
    expect(linkQuery({ ...calculator, inputs: [] }, 'heat', {}, 'rear')).toBe('')
  })
})
