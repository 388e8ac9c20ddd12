export type { BaseMoved, EditEntry, EditView, Preview }

import type { AdjustableView, EffectRow } from '../effects/index.ts'
import type { ChapterName, Person } from '../guides/views.ts'
import type { Heading, RenderProblem } from '../rendering/index.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { MergeConflict } from '#shared/editing/merge-guides.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { EditState } from '#shared/vocabulary/edit-states.ts'
import type { WorkedExample } from '#shared/guides/worked-examples.ts'

/** An edit in a list. Dates are ISO 8601. */
interface EditEntry {
  id: string
  /** Rises with every change of text or state; the ETag. */
  version: number
  state: EditState
  /** As the edit would have it; empty while a new guide has no title yet. */
  title: string
  /** The guide it improves; null for a new guide. */
  guide: { slug: string; mark: string; title: string } | null
  chapter: ChapterName
  author: Person
  summary: string
  /** Number of the edition it started from. */
  baseEdition: number | null
  createdAt: string
  updatedAt: string
  sentAt: string | null
  /** How much it changes against the edition it started from, as handed in; null while it is being written. */
  changes: ChangeSizes | null
  /** What a moderator asks for, while the edit is back with its writer. */
  asked: { reason: string; reviewer: Person } | null
}

/** Another edition was published since this edit began; `merged` holds both where they do not conflict. */
interface BaseMoved {
  edition: number
  mergeable: boolean
  merged: GuideDraft
  conflicts: MergeConflict[]
}

interface EditView extends EditEntry {
  content: GuideDraft
  author: Person & { approvedEdits: number }
  notes: { id: string; author: Person; text: string; createdAt: string }[]
  reviews: { decision: 'approve' | 'ask' | 'decline'; reason: string; reviewer: Person; version: number; decidedAt: string }[]
  baseMoved: BaseMoved | null
  /** Where it stands in the book, once approved. */
  published: { slug: string; edition: number } | null
  /** What the person who asks may do with it now: the right and the state together. */
  may: { save: boolean; send: boolean; withdraw: boolean; decide: boolean; note: boolean; rebase: boolean; merge: boolean }
}

/** What publishing would store and show. */
interface Preview {
  html: string
  parts: RenderedPart[]
  headings: Heading[]
  effects: EffectRow[]
  /** What laying it out has found; `line` counts in the Markdown. What `holds` has to be mended before the edit can be sent. */
  problems: (RenderProblem & { holds: boolean })[]
  /** Each worked example, run just now. */
  workedExamples: WorkedExample[]
  adjustables: AdjustableView[]
}
