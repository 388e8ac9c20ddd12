export { guidePage }
export type { GuidePage, PageSection }

import type { CarSheet } from '#shared/cars/car.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { buildLapRows, type LapRow } from '#shared/effects/lap-rows.ts'
import type { GuideContent } from '#shared/schemas/guide-content.ts'
import { bases, type Basis } from '#shared/vocabulary/effect-words.ts'
import { groundNames, groundsNamed, isGround, onGround, type Ground } from './ground.ts'
import { guideSegments, type GuideBody, type GuideEffect, type GuideSegment } from './guide-segments.ts'
import { withoutSharedClasses, type ClassNote } from './shared-classes.ts'

/** A part of the page that the thumb index leads to. */
interface PageSection {
  id: string
  name: string
}

interface Person {
  id: string
  name: string
}

/** What a guide's page prints as its edition holds it. */
interface GuideFacts extends Pick<GuideContent, 'title' | 'inShort' | 'answers' | 'bench' | 'sources'> {
  slug: string
  mark: string
  chapter: { letter: string; name: string }
  edition: number
  editions: number
  author: Person
  approver: Person
  contributors: (Person & { editions: number })[]
  publishedAt: string
  firstPublishedAt: string
}

/** One edition of a guide, as it is stored. */
interface GuideEdition extends GuideFacts, GuideBody {
  headings: readonly { level: number; id: string; text: string }[]
}

/** All that a guide's page shows and nothing else, ready to print. */
interface GuidePage extends GuideFacts {
  sections: PageSection[]
  lap: GuideLap | null
  benchFacts: { name: string; text: string }[]
  segments: GuideSegment[]
  /** What its effects rest on, in words. */
  restsOn: string[]
}

interface GuideLap {
  rows: LapRow[]
  classNotes: ClassNote[]
  grounds: { ground: Ground; name: string }[]
  ground: Ground | null
}

/** Makes a page of an edition: lap line for the ground asked for, body with its parts worked out, list of sections. */
function guidePage(
  { calculators }: { calculators: ReadonlyMap<string, CalculatorDefinition> },
  guide: GuideEdition,
  { path, query, car }: { path: string; query: Readonly<Record<string, string>>; car?: CarSheet | undefined },
): GuidePage {
  const lap = guideLap(guide, query.ground)
  const benchFacts = [
    { name: 'When to reach for it', text: guide.bench.reachFor },
    { name: 'How much to move it', text: guide.bench.moveBy },
    { name: 'What you give up', text: guide.bench.youGiveUp },
    { name: 'How long it takes', text: guide.bench.takes },
  ].filter(({ text }) => text !== '')
  return {
    slug: guide.slug, mark: guide.mark, chapter: guide.chapter, title: guide.title, inShort: guide.inShort, answers: guide.answers,
    bench: guide.bench, sources: guide.sources, edition: guide.edition, editions: guide.editions, author: guide.author,
    approver: guide.approver, contributors: guide.contributors, publishedAt: guide.publishedAt, firstPublishedAt: guide.firstPublishedAt,
    lap,
    benchFacts,
    segments: guideSegments(guide, { calculators, path, query, car }),
    restsOn: (Object.keys(bases) as Basis[])
      .filter((basis) => guide.effects.some((effect) => effect.basis === basis))
      .map((basis) => bases[basis].toLowerCase()),
    sections: [
      ...(lap === null ? [] : [{ id: 'around-the-lap', name: 'Around the lap' }]),
      ...(benchFacts.length === 0 ? [] : [{ id: 'when-and-how-much', name: 'When and how much' }]),
      ...guide.headings.filter(({ level }) => level === 2).map(({ id, text }) => ({ id, name: text })),
      { id: 'who-says-so', name: 'Who says so' },
    ],
  }
}

function guideLap(guide: GuideEdition, asked: string | undefined): GuideLap | null {
  if (guide.effects.length === 0) return null
  const named = groundsNamed(guide.effects)
  const ground = isGround(asked) && named.includes(asked) ? asked : null
  const { effects, notes } = withoutSharedClasses(guide.effects)
  const shown = ground === null ? effects : onGround(effects, ground)
  return {
    rows: buildLapRows(withoutRepeatedNotes(shown, guide), guide.adjustables),
    classNotes: notes,
    grounds: named.map((each) => ({ ground: each, name: groundNames[each] })),
    ground,
  }
}

/** Where the body shows an adjustable's own lap line, its reasons stand there; the table on top stays short enough to scan. */
function withoutRepeatedNotes(effects: readonly GuideEffect[], { parts }: GuideEdition): GuideEffect[] {
  const told = new Set(parts.flatMap((part) => (part.kind === 'effects' ? [part.adjustable] : [])))
  return effects.map((effect) => (told.has(effect.adjustable) ? { ...effect, note: '' } : effect))
}
