export { temperatureWorking }

import { fenced, frac, math, num, power, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'viscosityAt25' | 'referenceTemperature' | 'temperature', number>
type Outputs = Record<'viscosity' | 'viscosityAtReference' | 'ratio' | 'fluidToMatch', number>

const law = (bottle: MathPart, temperature: MathPart) =>
  row(bottle, '×', power(10, row(763.1, '×', fenced(frac(1, row(273, '+', temperature)), '−', frac(1, 298)))))
const at25 = sub('ν', '25')
const then = sub('ν', 'then')

function temperatureWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { viscosityAt25, referenceTemperature, temperature } = inputs
  const bottle = num(viscosityAt25, 9)
  return {
    symbols: [
      {
        symbol: math(at25),
        means: say`the number on the bottle, ${figure(viscosityAt25, 'cSt', 9)} at ${figure(25, '°C')}`,
      },
      { symbol: math('T'), means: say`temperature now in °C, ${figure(temperature, '°C', 6)}` },
      {
        symbol: math(sub('T', 'then')),
        means: say`temperature it felt right at in °C, ${figure(referenceTemperature, '°C', 6)}`,
      },
    ],
    steps: [
      {
        title: 'How thick it is now',
        formula: math('ν', '=', law(at25, 'T')),
        numbers: math('ν', '=', law(bottle, num(temperature, 6))),
        result: figure(outputs.viscosity, 'cSt', 4),
      },
      {
        title: 'How thick it was when it felt right',
        formula: math(then, '=', law(at25, sub('T', 'then'))),
        numbers: math(then, '=', law(bottle, num(referenceTemperature, 6))),
        result: figure(outputs.viscosityAtReference, 'cSt', 4),
      },
      {
        title: 'Now over then',
        formula: math('r', '=', frac('ν', then)),
        numbers: math('r', '=', frac(num(outputs.viscosity), num(outputs.viscosityAtReference))),
        result: figure(outputs.ratio, '1', 4),
      },
      {
        title: 'The bottle that would be as thick now as yours was then',
        formula: math(sub('ν', 'match'), '=', frac(at25, 'r')),
        numbers: math(sub('ν', 'match'), '=', frac(bottle, num(outputs.ratio))),
        result: figure(outputs.fluidToMatch, 'cSt', 4),
      },
    ],
  }
}
