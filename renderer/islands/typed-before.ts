export { typedBefore }

type Field = HTMLInputElement | HTMLTextAreaElement

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
    for (const { name, value } of typed) {
      const field = fields.find((candidate) => candidate.name === name)
      if (field === undefined) continue
      field.value = value
      field.dispatchEvent(new Event('input', { bubbles: true }))
    }
  }
}

function fieldsOf(root: ParentNode): Field[] {
  return [...root.querySelectorAll<Field>('input[name]:not([type=radio], [type=checkbox]), textarea[name]')]
}
