export { typedTexts }

import { carValueByKey } from '#shared/cars/car-values.ts'
import { unitById } from '#shared/units/units.ts'

interface TypedText {
  /** Field name in the form, so that a wrong password does not lose the text either. */
  name: string
  label: string
  text: string
}

const labels: Record<string, string> = {
  title: 'Title', inShort: 'In short', body: 'Text of the guide', summary: 'What changed', reason: 'Reason', text: 'Note', note: 'Note', name: 'Name',
  'bench.reachFor': 'When to reach for it', 'bench.moveBy': 'How much to move it', 'bench.youGiveUp': 'What it costs', 'bench.takes': 'How long it takes',
}
const rows: Record<string, string> = { answers: 'Answer', effects: 'Effect', sources: 'Source' }

/** What somebody had typed into another form when their session ended, as that form's answer carries it. */
function typedTexts(values: Record<string, string>): TypedText[] {
  return Object.entries(values).flatMap(([name, text]) => {
    const field = /^typed\.(.+)$/.exec(name)?.[1]
    return field === undefined ? [] : [{ name, label: labelOf(field), text }]
  })
}

function labelOf(field: string): string {
  const [list = '', number, part] = field.split('.')
  const row = rows[list]
  // A value of “my car”, with what it is measured in: a bare number says neither.
  const value = list === 'value' ? carValueByKey(number ?? '') : undefined
  if (value !== undefined) return value.unit === '1' ? value.label : `${value.label}, ${unitById(value.unit).symbol}`
  return labels[field] ?? (row === undefined ? field : `${row} ${Number(number) + 1}, ${part}`)
}
