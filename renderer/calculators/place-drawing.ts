export { placeDrawing }
export type { PlacedDrawing, PlacedText }

import { plainSentence } from '#shared/calculators/sentence.ts'
import { figureWidth as width, round } from './figure-size.ts'
import { keepApart, type PlacedText } from './keep-apart.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '#shared/calculators/drawing.ts'
import type { UnitChoices } from '#shared/units/unit-choices.ts'

interface PlacedDrawing {
  width: number
  height: number
  /** Units of the picture to one unit of the drawing. */
  scale: number
  /** Everything but words, in the order of drawing, each with the classes of its style. */
  strokes: { d: string; look: string }[]
  texts: PlacedText[]
  /** Where a point of the drawing stands in the picture. */
  at(point: DrawingPoint): [x: number, y: number]
}

const margin = 12
const tallest = 400

/** A drawing as places in its picture, the same on the server and in the browser. */
function placeDrawing({ frame, shapes }: DrawingSpec, choices: UnitChoices): PlacedDrawing {
  const across = frame.right - frame.left
  const up = frame.top - frame.bottom
  const scale = Math.min((width - 2 * margin) / across, (tallest - 2 * margin) / up)
  const height = Math.round(up * scale + 2 * margin)
  const left = (width - across * scale) / 2
  const at = ([x, y]: DrawingPoint): [number, number] => [
    round(left + (x - frame.left) * scale),
    round(margin + (frame.top - y) * scale),
  ]

  const strokes: PlacedDrawing['strokes'] = []
  const texts: PlacedText[] = []
  const stroke = (d: string, look: string) => strokes.push({ d, look })
  for (const shape of shapes) draw(shape)
  return { width, height, scale, strokes, texts: keepApart(texts, width, height), at }

  function draw(shape: DrawingShape): void {
    switch (shape.kind) {
      case 'line': {
        const points = shape.points.map(at)
        stroke(`M${points.map((point) => point.join(' ')).join('L')}${shape.closed ? 'Z' : ''}`, shape.style)
        if (shape.style === 'ground') stroke(hatching(points), 'hatch')
        return
      }
      case 'circle':
        stroke(ring(at(shape.at), shape.radius * scale), shape.style)
        return
      case 'arc':
        stroke(arc(at(shape.at), shape.radius * scale, shape.from, shape.to), shape.style)
        return
      case 'arrow': {
        const [from, to] = [at(shape.from), at(shape.to)]
        stroke(`M${from.join(' ')}L${to.join(' ')}`, shape.style)
        stroke(head(from, to), `${shape.style} tip`)
        return
      }
      case 'point':
        stroke(ring(at(shape.at), 4.5), `${shape.style} joint`)
        return
      case 'dimension':
        return dimension(shape)
      case 'label': {
        const [x, y] = at(shape.at)
        texts.push({
          x,
          y: y + 5,
          text: plainSentence(shape.text, choices),
          anchor: shape.anchor,
          look: shape.style ?? '',
        })
      }
    }
  }

  /** The length between two places with a line out from either, its number standing in the line or above it. */
  function dimension({ from, to, offset, label }: DrawingShape & { kind: 'dimension' }): void {
    const [a, b] = [at(from), at(to)]
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]) || 1
    const along = [(b[0] - a[0]) / length, (b[1] - a[1]) / length] as const
    const aside = (point: readonly [number, number], by: number): [number, number] => [
      round(point[0] + along[1] * by),
      round(point[1] - along[0] * by),
    ]
    const far = offset * scale
    const past = far + Math.sign(far) * 5
    const [start, end] = [aside(a, far), aside(b, far)]
    if (far !== 0)
      stroke(`M${a.join(' ')}L${aside(a, past).join(' ')}M${b.join(' ')}L${aside(b, past).join(' ')}`, 'dim')
    stroke(`M${start.join(' ')}L${end.join(' ')}${head(start, end)}${head(end, start)}`, 'dim')
    texts.push({
      x: round((start[0] + end[0]) / 2),
      y: round((start[1] + end[1]) / 2) + 5,
      text: plainSentence(label, choices),
      anchor: 'middle',
      look: 'dim',
    })
  }
}

function ring([x, y]: readonly [number, number], radius: number): string {
  const r = round(radius)
  return `M${round(x - r)} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0z`
}

/** Angles in degrees anticlockwise, as in the drawing; on the screen y points down. */
function arc([x, y]: readonly [number, number], radius: number, from: number, to: number): string {
  const end = (degrees: number) => {
    const angle = (degrees * Math.PI) / 180
    return `${round(x + radius * Math.cos(angle))} ${round(y - radius * Math.sin(angle))}`
  }
  const r = round(radius)
  return `M${end(from)}A${r} ${r} 0 ${Math.abs(to - from) > 180 ? 1 : 0} ${to > from ? 0 : 1} ${end(to)}`
}

/** The open tip of an arrow. */
function head(from: readonly [number, number], to: readonly [number, number]): string {
  const direction = Math.atan2(to[1] - from[1], to[0] - from[0])
  const barb = (turn: number) =>
    `${round(to[0] - 8 * Math.cos(direction + turn))} ${round(to[1] - 8 * Math.sin(direction + turn))}`
  return `M${barb(0.42)}L${to.join(' ')}L${barb(-0.42)}`
}

/** Short strokes below the ground. */
function hatching(points: readonly (readonly [number, number])[]): string {
  return points
    .slice(1)
    .map(([x, y], index) => {
      const [fromX, fromY] = points[index]!
      const count = Math.floor(Math.hypot(x - fromX, y - fromY) / 10)
      return Array.from({ length: count }, (_, place) => {
        const share = (place + 0.8) / count
        return `M${round(fromX + (x - fromX) * share)} ${round(fromY + (y - fromY) * share)}l-6 6`
      }).join('')
    })
    .join('')
}
