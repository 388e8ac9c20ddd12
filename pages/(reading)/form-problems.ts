export { errorAt, formProblems }

interface RefusedForm {
  problems: readonly { field: string; message: string }[]
  message: string
}

/** What stands in the summary: each problem at its field, or the one sentence about the whole form. */
function formProblems(form: RefusedForm | null): readonly { field: string; message: string }[] {
  if (form === null) return []
  return form.problems.length > 0 ? form.problems : [{ field: '', message: form.message }]
}

/** What is wrong with one field, if anything. */
function errorAt(form: RefusedForm | null, field: string): string | undefined {
  return form?.problems.find((problem) => problem.field === field)?.message
}
