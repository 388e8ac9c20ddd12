export { drawingPart }

import type { InjectionKey } from 'vue'
import type DrawingFigure from './DrawingFigure.vue'

/** What draws a `DrawingSpec`; there only where the calculator has drawings, so that the others need not load it. */
const drawingPart: InjectionKey<typeof DrawingFigure> = Symbol('drawing part')
