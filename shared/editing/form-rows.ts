export { changeRows, rowAction }

import type { FormFields } from './form-fields.ts'

type List = 'answers' | 'effects' | 'sources'
type RowAction = { list: List; deed: 'add' } | { list: List; deed: 'remove'; row: number }

const nouns: Record<string, List> = { answer: 'answers', effect: 'effects', source: 'sources' }

/** A new row as the form shows it first: nothing is claimed that nobody has written. */
const fresh: Record<List, FormFields> = {
  answers: { heading: '', text: '' },
  effects: { adjustable: '', direction: '', phase: '', quality: '', change: '', strength: '', basis: '', note: '' },
  sources: { kind: 'common_practice', text: '', url: '' },
}

/** Reads a button's value such as `add-effect` or `remove-source:3`; null when it is no such button. */
function rowAction(button: string): RowAction | null {
  const match = /^(add|remove)-(answer|effect|source)(?::(\d{1,4}))?$/.exec(button)
  if (match === null) return null
  const list = nouns[match[2]!]!
  if (match[1] === 'add') return match[3] === undefined ? { list, deed: 'add' } : null
  return match[3] === undefined ? null : { list, deed: 'remove', row: Number(match[3]) }
}

/** The form's fields after a row was put in at the end of a list or taken out of it. */
function changeRows(fields: FormFields, action: RowAction): FormFields {
  if (action.deed === 'remove') {
    const gone = `${action.list}.${action.row}.`
    return Object.fromEntries(Object.entries(fields).filter(([name]) => !name.startsWith(gone)))
  }
  const numbers = Object.keys(fields).flatMap((name) => {
    const [list, number] = name.split('.')
    return list === action.list && /^\d{1,4}$/.test(number ?? '') ? [Number(number)] : []
  })
  const next = Math.max(-1, ...numbers) + 1
  const row = Object.entries(fresh[action.list]).map(([key, value]) => [`${action.list}.${next}.${key}`, value])
  return { ...fields, ...Object.fromEntries(row) }
}
