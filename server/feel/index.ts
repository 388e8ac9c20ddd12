// The door: what the rest of the server and the pages may use of by feel.
export { askByFeel } from './ask-by-feel.ts'
export type { FeelAnswer, FeelChange, FeelEvidence } from './ask-by-feel.ts'
export { listAnswered } from './list-answered.ts'
export { listFirstLooks } from './list-first-looks.ts'
export { feelDescription } from './api-description.ts'
export { feelApi } from './routes.ts'
