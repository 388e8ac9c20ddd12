export { SentenceText }

import { h, type FunctionalComponent } from 'vue'
import { formatChosen, type UnitChoices } from '#shared/units/unit-choices.ts'
import type { Sentence } from '#shared/calculators/sentence.ts'

/** A sentence in the reader's units, its main figure in bold. */
const SentenceText: FunctionalComponent<{ sentence: Sentence; units?: UnitChoices }> = ({
  sentence,
  units = {},
}) =>
  sentence.map((part) => {
    if (typeof part === 'string') return part
    const text = formatChosen(part.value, part.unit, part.digits, units)
    return part.main ? h('b', text) : text
  })
SentenceText.props = ['sentence', 'units']
