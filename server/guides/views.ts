export type {
  ChapterName, EditionName, FreshInkEntry, GuideCard, GuideEntry, GuideView, Moved, Person, Reach, WantedGuide,
}

import type { AdjustableView, EffectRow } from '../effects/index.ts'
import type { Heading } from '../rendering/index.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { GuideContent } from '#shared/schemas/guide-content.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'

interface Person {
  id: string
  name: string
}

interface ChapterName {
  letter: string
  name: string
}

/** The guide has another address now. */
interface Moved {
  movedTo: string
}

interface GuideEntry {
  slug: string
  mark: string
  title: string
  inShort: string
  /** Letter of its chapter. */
  chapter: string
  /** Number of the published edition. */
  edition: number
}

/** The strongest effect in each part of the lap; all 0 for a guide about care rather than tuning. */
type Reach = Record<Phase, 0 | 1 | 2 | 3>

type GuideCard = GuideEntry & {
  reach: Reach
  /** Least minutes of what its effects change; null when it has none. */
  minutes: number | null
}

/** One edition of a guide with all that its page shows. Dates are ISO 8601. */
interface GuideView extends GuideContent {
  id: string
  slug: string
  mark: string
  number: number
  chapter: ChapterName
  html: string
  parts: RenderedPart[]
  headings: Heading[]
  effects: EffectRow[]
  /** Everything that its effects or its text speak of. */
  adjustables: AdjustableView[]
  edition: number
  /** How many editions there are. */
  editions: number
  summary: string
  author: Person
  approver: Person
  /** Everyone who wrote an edition up to this one, most editions first. */
  contributors: (Person & { editions: number })[]
  publishedAt: string
  firstPublishedAt: string
}

interface EditionName {
  number: number
  summary: string
  author: Person
  publishedAt: string
}

interface FreshInkEntry {
  slug: string
  mark: string
  title: string
  edition: number
  summary: string
  author: Person
  publishedAt: string
  changes: ChangeSizes
}

interface WantedGuide {
  id: string
  chapter: string
  title: string
  why: string
}
