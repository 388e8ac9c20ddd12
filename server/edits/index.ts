// The door: what the rest of the server may use of edits. Pages take each service from its own file, so that they bundle no other.
export { editsApi } from './api.ts'
export { editsDescription } from './api-description.ts'
export { editsForms } from './forms.ts'
export type { EditEntry, EditView } from './views.ts'
