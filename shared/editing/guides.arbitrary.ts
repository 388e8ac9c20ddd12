// Random guides for property tests. Words come from a small stock, so that two guides often share parts.
export { arbitraryBody, arbitraryGuide, arbitraryNeighbours }

import fc from 'fast-check'
import { GuideDraft } from '../schemas/guide-content.ts'
import { BITES, CAR_CLASSES, SURFACES } from '../vocabulary/conditions.ts'
import { BASES, CHANGES, DIRECTIONS, STRENGTHS } from '../vocabulary/effect-words.ts'
import { PHASES } from '../vocabulary/phases.ts'
import { QUALITIES } from '../vocabulary/qualities.ts'
import { SOURCE_KINDS } from '../vocabulary/source-kinds.ts'

const word = fc.constantFrom('droop', 'fluid,', 'the', 'rear.', 'grip', '7,000', '“push”', 'café', '🏁', '-', 'on power')
const line = fc.array(word, { minLength: 0, maxLength: 8 }).map((words) => words.join(' '))
const bodyLine = fc.oneof(line, fc.constant(''), fc.constant('## How it works'), fc.constant('::calculator{slug=fluid-blend}'))
const arbitraryBody = fc.oneof(
  fc.array(bodyLine, { maxLength: 20 }).map((lines) => lines.join('\n')),
  fc.string({ maxLength: 60 }).map((text) => text.replaceAll('\u0000', '').replace(/\r\n?/g, '\n')),
)

const effect = fc.record({
  adjustable: fc.constantFrom('front_diff_fluid', 'rear_droop'),
  direction: fc.constantFrom(...DIRECTIONS),
  phase: fc.constantFrom(...PHASES.slice(0, 3)),
  quality: fc.constantFrom(...QUALITIES.slice(0, 2)),
  change: fc.constantFrom(...CHANGES),
  strength: fc.constantFrom(...STRENGTHS),
  surfaces: fc.subarray([...SURFACES]),
  bites: fc.subarray([...BITES]),
  carClasses: fc.subarray([...CAR_CLASSES]),
  mirrors: fc.boolean(),
  basis: fc.constantFrom(...BASES),
  note: line,
})
const source = fc.record({
  kind: fc.constantFrom(...SOURCE_KINDS),
  text: line,
  url: fc.constantFrom('', 'https://example.org/a', 'http://example.org/b'),
})

const arbitraryGuide: fc.Arbitrary<GuideDraft> = fc
  .record({
    title: line,
    inShort: line,
    answers: fc.array(fc.record({ heading: line, text: line }), { maxLength: 2 }),
    bench: fc.record({ reachFor: line, moveBy: line, youGiveUp: line, takes: line }),
    body: arbitraryBody,
    effects: fc.array(effect, { maxLength: 6 }),
    sources: fc.array(source, { maxLength: 4 }),
  })
  .map((guide) => GuideDraft.safeParse(guide))
  .filter((parsed) => parsed.success)
  .map((parsed) => parsed.data!)

/** A base and two guides that each differ from it in some parts only, as two members' edits do. */
const arbitraryNeighbours = fc
  .tuple(arbitraryGuide, arbitraryGuide, arbitraryGuide, fc.subarray(partNames()), fc.subarray(partNames()))
  .map(([base, one, other, mineParts, theirParts]) => ({
    base,
    mine: { ...base, ...pick(one, mineParts) },
    theirs: { ...base, ...pick(other, theirParts) },
  }))

function partNames(): (keyof GuideDraft)[] {
  return ['title', 'inShort', 'answers', 'bench', 'body', 'effects', 'sources']
}

function pick(guide: GuideDraft, parts: (keyof GuideDraft)[]): Partial<GuideDraft> {
  return Object.fromEntries(parts.map((part) => [part, guide[part]]))
}
