// The door: what the rest of the server and the pages may use of effects.
export type { AdjustableView, EffectRow } from './adjustable-view.ts'
export { effectRow } from './adjustable-view.ts'
export { findAdjustables } from './find-adjustables.ts'
export { listAdjustables } from './list-adjustables.ts'
export { listLapEffects } from './list-lap-effects.ts'
export type { LapEffect } from './list-lap-effects.ts'
