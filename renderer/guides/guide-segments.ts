export { guideSegments }
export type { GuideBody, GuideEffect, GuideSegment }

import { runWorkedExamples } from '#shared/guides/worked-examples.ts'
import { splitParts } from '#shared/rendering/split-parts.ts'
import type { CalculatorPart, RenderedPart } from '#shared/rendering/parts.ts'
import { buildLapRows, type AdjustableWords, type LapRow } from '#shared/effects/lap-rows.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import { parametersFor } from '#shared/calculators/query.ts'
import type { CarSheet } from '#shared/cars/car.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import type { InstrumentProps } from '../calculators/instrument-props.ts'
import { exampleWords, type ExampleWords } from './example-words.ts'
import { withoutSharedClasses } from './shared-classes.ts'

interface CalculatorSegment {
  kind: 'calculator'
  props: InstrumentProps
}

interface EffectsSegment {
  kind: 'effects'
  name: string
  rows: LapRow[]
}

type WorkedSegment = { kind: 'worked'; example: ExampleWords }

/** A body in reading order, everything worked out: what a page puts out one after the other. */
type GuideSegment = { kind: 'html'; html: string } | CalculatorSegment | EffectsSegment | WorkedSegment

/** An effect with the name of what is moved. */
type GuideEffect = Effect & { adjustableName: string }

interface GuideBody {
  html: string
  parts: readonly RenderedPart[]
  effects: readonly GuideEffect[]
  adjustables: readonly AdjustableWords[]
}

interface Surroundings {
  calculators: ReadonlyMap<string, CalculatorDefinition>
  /** Path of the page, where the calculators' forms go. */
  path: string
  query: Readonly<Record<string, string>>
  /** The reader's own car, where the server knows it. */
  car?: CarSheet | undefined
}

/**
 * Cuts a stored body at its parts and fills these in: lap lines from the effects, calculators with what the address says
 * about them, worked examples computed again. A calculator that is no longer there leaves no hole: its part is left out.
 */
function guideSegments(body: GuideBody, { calculators, path, query, car }: Surroundings): GuideSegment[] {
  const instanceOf = instanceNames(body.parts)
  const examples = new Map(runWorkedExamples({ calculators }, body.parts).map((example) => [example.n, example]))
  return splitParts(body.html, body.parts).flatMap((segment): GuideSegment[] => {
    switch (segment.kind) {
      case 'html':
        return [segment]
      case 'effects':
        return [effectsSegment(segment.adjustable, body)]
      case 'worked': {
        const calculator = calculators.get(segment.slug)
        const example = examples.get(segment.n)
        return calculator === undefined || example === undefined ? [] : [{ kind: 'worked', example: exampleWords(example, calculator) }]
      }
      case 'calculator': {
        if (!calculators.has(segment.slug)) return []
        const instanceId = instanceOf(segment)
        return [{
          kind: 'calculator',
          props: {
            slug: segment.slug, instanceId, action: path, headingLevel: 3, values: parametersFor(query, instanceId),
            ...(Object.keys(segment.preset).length > 0 ? { preset: segment.preset } : {}),
            ...(segment.end && { end: segment.end }),
            ...(car && { car }),
          },
        }]
      }
    }
  })
}

function effectsSegment(key: string, { effects, adjustables }: GuideBody): EffectsSegment {
  const own = withoutSharedClasses(effects.filter((effect) => effect.adjustable === key))
  const name = adjustables.find((adjustable) => adjustable.key === key)?.name ?? key
  return { kind: 'effects', name, rows: buildLapRows(own.effects, adjustables) }
}

/** The first instrument of a kind carries its own name in links, the next ones a number: `fluid-blend`, `fluid-blend-2`. */
function instanceNames(parts: readonly RenderedPart[]): (part: CalculatorPart) => string {
  const names = new Map<number, string>()
  const used = new Map<string, number>()
  for (const part of parts) {
    if (part.kind !== 'calculator') continue
    const times = (used.get(part.slug) ?? 0) + 1
    used.set(part.slug, times)
    names.set(part.n, times === 1 ? part.slug : `${part.slug}-${times}`)
  }
  return (part) => names.get(part.n) ?? part.slug
}
