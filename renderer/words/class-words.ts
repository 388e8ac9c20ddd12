export { classWords }

import { CAR_CLASSES, carClasses, type CarClass } from '#shared/vocabulary/conditions.ts'

/** For which cars something holds, the shorter way round: “1/8 truggy”, or “all classes but 1/10 2WD buggy”. */
function classWords(classes: readonly CarClass[]): string {
  const others = CAR_CLASSES.filter((carClass) => !classes.includes(carClass))
  if (classes.length === 0 || others.length === 0) return ''
  const named = (list: readonly CarClass[]) => list.map((carClass) => carClasses[carClass]).join(', ')
  return others.length < 3 ? `all classes but ${named(others)}` : named(CAR_CLASSES.filter((carClass) => classes.includes(carClass)))
}
