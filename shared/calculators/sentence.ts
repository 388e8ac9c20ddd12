export { figure, mainFigure, plainSentence, say }
export type { Figure, Sentence }

import { formatChosen, type UnitChoices } from '#shared/units/unit-choices.ts'
import type { UnitId } from '#shared/units/units.ts'

/**
 * A number inside a sentence. It stays a number with its unit until it is shown, so that a reader sees it in
 * their own unit.
 */
interface Figure {
  value: number
  unit: UnitId
  /** Significant digits. */
  digits: number
  /** The figure the sentence is about; a sentence has at most one. */
  main?: true
}

/** Words and figures in reading order. Data, not HTML: the page and the API each print it their own way. */
type Sentence = readonly (string | Figure)[]

/** A figure; temperatures are readings, so do not pass a difference of two temperatures in °C. */
function figure(value: number, unit: UnitId, digits = 3): Figure {
  return { value, unit, digits }
}

function mainFigure(value: number, unit: UnitId, digits = 3): Figure {
  return { value, unit, digits, main: true }
}

/** Template tag: say`Mix ${figure(4.854, 'mL')} of it.` */
function say(words: TemplateStringsArray, ...parts: (Figure | string)[]): Sentence {
  return words.flatMap((word, index) => [word, parts[index] ?? '']).filter((part) => part !== '')
}

/** The sentence as plain text, in the reader's units or, without choices, in the calculator's own. */
function plainSentence(sentence: Sentence, choices: UnitChoices = {}): string {
  return sentence
    .map((part) =>
      typeof part === 'string' ? part : formatChosen(part.value, part.unit, part.digits, choices),
    )
    .join('')
}
