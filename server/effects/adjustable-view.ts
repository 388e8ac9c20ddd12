export { adjustableColumns, effectRow }
export type { AdjustableView, EffectRow }

import { adjustables } from '../db/schema/index.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import type { Axle } from '#shared/vocabulary/axles.ts'

interface AdjustableView {
  key: string
  name: string
  axle: Axle
  unit: string
  /** What its two directions are called, such as thicker and thinner. */
  up: string
  down: string
  /** The usual small step, in `unit`. */
  smallStep: number
  minutes: number
  tools: string[]
  opensCar: boolean
  guide: string | null
  about: string
}

/** An effect with the words that name its change: “Front diff fluid”, “thicker”. */
type EffectRow = Effect & { adjustableName: string; way: string }

const adjustableColumns = {
  key: adjustables.key,
  name: adjustables.name,
  axle: adjustables.axle,
  unit: adjustables.unit,
  up: adjustables.upName,
  down: adjustables.downName,
  smallStep: adjustables.smallStep,
  minutes: adjustables.minutes,
  tools: adjustables.tools,
  opensCar: adjustables.opensCar,
  guide: adjustables.guideSlug,
  about: adjustables.about,
}

/** Adds the names. An old edition may speak of an adjustable that is no longer there; its key then stands for it. */
function effectRow(effect: Effect, adjustable: Pick<AdjustableView, 'name' | 'up' | 'down'> | undefined): EffectRow {
  return { ...effect, adjustableName: adjustable?.name ?? effect.adjustable, way: adjustable?.[effect.direction] ?? effect.direction }
}
