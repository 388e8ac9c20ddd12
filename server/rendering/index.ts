// The door: what the rest of the server may use of rendering. The parts of a body and how it is split stand in
// shared/rendering, where pages that only lay out stored HTML use them too.
export { RenderRefusedError } from './errors.ts'
export type { RefusalCode } from './errors.ts'
export { holdsBack } from './holding-problems.ts'
export { createGuideRenderer } from './guide-renderer.ts'
export type { GuideRenderer, GuideRendererOptions, RenderOrder } from './guide-renderer.ts'
export type { CalculatorVocabulary, Heading, RenderProblem, RenderResult, RenderVocabulary } from './types.ts'
export { RENDERER_VERSION } from './version.ts'
