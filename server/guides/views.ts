export type {
  ChapterName, EditionName, FreshInkEntry, GuideCard, GuideEntry, GuideView, Moved, Person, Reach, WantedGuide,
}

import type { z } from 'zod'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'
import type * as answers from './answers.ts'

// What the API answers too is read from its schemas.
type Person = z.infer<typeof answers.Person>
type ChapterName = z.infer<typeof answers.ChapterName>
type GuideEntry = z.infer<typeof answers.GuideEntry>
/** One edition of a guide with all that its page shows. */
type GuideView = z.infer<typeof answers.GuideAnswer>

/** The guide has another address now. */
interface Moved {
  movedTo: string
}

/** The strongest effect in each part of the lap; all 0 for a guide about care rather than tuning. */
type Reach = Record<Phase, 0 | 1 | 2 | 3>

type GuideCard = GuideEntry & {
  reach: Reach
  /** Least minutes of what its effects change; null when it has none. */
  minutes: number | null
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
