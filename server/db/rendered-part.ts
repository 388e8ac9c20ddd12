export type { RenderedPart } from '../rendering/index.ts'
