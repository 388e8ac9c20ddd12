export { problemsByField, fieldId }
export type { Problem }

interface Problem {
  field: string
  message: string
}

/** The id of a field on the write page: the API names it inside `content`, the plain form does not. */
function fieldId(field: string): string {
  return field.replace(/^content\./, '')
}

/** The first problem of each field, by the field's id. */
function problemsByField(problems: readonly Problem[]): Record<string, string> {
  const byField: Record<string, string> = {}
  for (const { field, message } of problems) byField[fieldId(field)] ??= message
  return byField
}
