export { effectColumns }

import { effects } from '../db/schema/index.ts'

/** The columns that make up an effect as guides state it. */
const effectColumns = {
  adjustable: effects.adjustable,
  direction: effects.direction,
  phase: effects.phase,
  quality: effects.quality,
  change: effects.change,
  strength: effects.strength,
  surfaces: effects.surfaces,
  bites: effects.bites,
  carClasses: effects.carClasses,
  mirrors: effects.mirrors,
  basis: effects.basis,
  note: effects.note,
}
