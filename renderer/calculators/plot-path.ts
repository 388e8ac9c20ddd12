export { clippedPath }
export type { PlotPlace }

import { round } from './figure-size.ts'

type PlotPlace = readonly [x: number, y: number]

/** A line as a path, cut where it leaves the plot between `top` and `bottom`; places without a number break it. */
function clippedPath(places: readonly PlotPlace[], top: number, bottom: number): string {
  let path = ''
  let open = false
  places.forEach((here, index) => {
    const before = places[index - 1]
    const inside = isInside(here)
    if (before !== undefined && inside !== isInside(before) && finite(here) && finite(before)) {
      const edge = crossing(before, here, (inside ? before : here)[1] < top ? top : bottom)
      path += inside ? `M${edge}` : `L${edge}`
      open = inside
    }
    if (inside) path += `${open ? 'L' : 'M'}${here.join(' ')}`
    open = inside
  })
  return path

  function isInside([x, y]: PlotPlace): boolean {
    return Number.isFinite(x) && y >= top - 0.5 && y <= bottom + 0.5
  }
}

function finite([x, y]: PlotPlace): boolean {
  return Number.isFinite(x) && Number.isFinite(y)
}

function crossing(from: PlotPlace, to: PlotPlace, y: number): string {
  const share = (y - from[1]) / (to[1] - from[1])
  return `${round(from[0] + (to[0] - from[0]) * share)} ${round(y)}`
}
