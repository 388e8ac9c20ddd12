// The door: what the rest of the server may use of rendering. Pages that only lay out stored HTML import
// split-parts.ts.
export { RenderRefusedError } from './errors.ts'
export type { RefusalCode } from './errors.ts'
export { createGuideRenderer } from './guide-renderer.ts'
export type { GuideRenderer, GuideRendererOptions } from './guide-renderer.ts'
export { partPlaceholder, splitParts } from './split-parts.ts'
export type {
  BodySegment, CalculatorPart, CalculatorVocabulary, EffectsPart, Heading, RenderedPart, RenderProblem, RenderResult,
  RenderVocabulary, WorkedPart,
} from './types.ts'
export { RENDERER_VERSION } from './version.ts'
