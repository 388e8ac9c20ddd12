export { typeAgainKey, typedBefore }

import type { InjectionKey } from 'vue'

type Field = HTMLInputElement | HTMLTextAreaElement

/**
 * How an island types again what was typed before it was alive, for one that has to do so itself: before it takes up what this
 * browser keeps, so that a number means what it meant beside the unit that the server printed. Does it once.
 */
const typeAgainKey: InjectionKey<() => void> = Symbol('type again')

/**
 * Remembers the fields that no longer hold what the server printed, and returns a function that types it in again, since
 * hydration puts every field back to the value it knows.
 */
function typedBefore(root: ParentNode): () => void {
  const typed = fieldsOf(root)
    .filter((field) => field.value !== field.defaultValue)
    .map(({ name, value }) => ({ name, value }))
  return () => {
    const fields = fieldsOf(root)
    for (const { name, value } of typed.splice(0)) {
      const field = fields.find((candidate) => candidate.name === name)
      if (field === undefined) continue
      field.value = value
      field.dispatchEvent(new Event('input', { bubbles: true }))
    }
  }
}

function fieldsOf(root: ParentNode): Field[] {
  return [...root.querySelectorAll<Field>('input[name]:not([type=radio], [type=checkbox], [type=hidden]), textarea[name]')]
}
