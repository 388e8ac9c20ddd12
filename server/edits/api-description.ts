export { editsDescription }

import { z } from 'zod'
import type { ApiDescription, ApiOperation } from '../http/openapi/describe.ts'
import { EffectDraft } from '#shared/schemas/effect.ts'
import { GuideDraft } from '#shared/schemas/guide-content.ts'
import { ApprovalAnswer, BaseMovedAnswer, ChangeSizesAnswer, ConflictAnswer, EditAnswer, EditEntryAnswer, PreviewAnswer, SentAnswer, WorkedExampleAnswer } from './answers.ts'
import { ListQuery } from './api.ts'
import { CreateInput, DecisionInput, MergeInput, NoteInput, PreviewInput, ReasonInput, SaveInput, SendInput } from './inputs.ts'

// The version stands in If-Match.
const withoutVersion = { version: true } as const

const params = { id: z.uuid() }
const HIDDEN = 'There is no such edit, or it is hidden from who asks.'
const WRONG_STATE = 'Its state does not allow this (`wrong_state`).'
const MOVED = 'A newer edition was published (`base_moved`, `base_moved_mergeable`).'

/** What the changes of an edit have in common. */
const change = {
  params,
  ifMatch: true,
  limited: true,
  answers: { 200: { says: 'The edit as it is now.', body: EditAnswer, headers: ['ETag'] } },
  problems: { 404: HIDDEN, 409: WRONG_STATE },
} satisfies Partial<ApiOperation>

const writing = { ...change, who: 'verified members' } satisfies Partial<ApiOperation>
const deciding = { ...change, who: 'moderators', once: true } satisfies Partial<ApiOperation>

const editsDescription: ApiDescription = {
  name: 'Edits',
  about: 'Writing guides and approving what was written. Every change of an edit is made for a version (If-Match).',
  answers: {
    GuideDraft,
    EffectDraft,
    Edit: EditAnswer,
    EditEntry: EditEntryAnswer,
    BaseMoved: BaseMovedAnswer,
    MergeConflict: ConflictAnswer,
    ChangeSizes: ChangeSizesAnswer,
    Preview: PreviewAnswer,
    WorkedExample: WorkedExampleAnswer,
  },
  inputs: { EffectInput: EffectDraft },
  operations: {
    'GET /edits': {
      id: 'listEdits',
      summary: 'One’s own edits, newest first; for moderators also everyone’s, those that wait longest first.',
      who: 'members',
      query: ListQuery,
      answers: { 200: { says: 'One page of edits.', body: z.array(EditEntryAnswer), headers: ['X-Total-Count'] } },
      problems: { 403: 'The review desk is for moderators.' },
    },
    'POST /edits': {
      id: 'createEdit',
      summary: 'Begins an edit of a guide, or of a new guide in a chapter.',
      who: 'verified members',
      once: true,
      limited: true,
      body: CreateInput,
      answers: {
        200: { says: 'There was an open edit of that guide by the same writer: that one.', body: EditAnswer, headers: ['ETag', 'Location'] },
        201: { says: 'The new edit.', body: EditAnswer, headers: ['ETag', 'Location'] },
      },
      problems: { 404: 'There is no such guide, edition or chapter.' },
    },
    'GET /edits/:id': {
      id: 'getEdit',
      summary: 'An edit with its notes and decisions: for its writer, and for moderators once it was sent.',
      who: 'members',
      params,
      answers: change.answers,
      problems: { 404: HIDDEN },
    },
    'PUT /edits/:id': { ...writing, id: 'saveEdit', summary: 'Keeps what was written so far.', body: SaveInput.omit(withoutVersion) },
    'POST /edits/:id/send': {
      ...writing,
      id: 'sendEdit',
      summary: 'Hands an edit in for review. It has to be whole by now.',
      once: true,
      body: SendInput.omit(withoutVersion),
      answers: { 200: { ...change.answers[200], body: SentAnswer } },
      problems: { ...change.problems, 409: `${WRONG_STATE} ${MOVED} Five edits wait already (\`too_many_waiting\`).` },
    },
    'POST /edits/:id/withdraw': {
      ...change,
      id: 'withdrawEdit',
      summary: 'Takes an edit back for good.',
      who: 'members',
      once: true,
    },
    'POST /edits/:id/merge': {
      ...writing,
      id: 'mergeEdit',
      summary: 'Keeps a text in which the writer has settled what both sides changed.',
      once: true,
      body: MergeInput.omit(withoutVersion),
      problems: { ...change.problems, 409: `${WRONG_STATE} ${MOVED}` },
    },
    'POST /edits/:id/rebase': {
      ...change,
      id: 'rebaseEdit',
      summary: 'Puts an edit and the edition published since into one, to be looked at again.',
      who: 'members',
      once: true,
      problems: { ...change.problems, 409: `${WRONG_STATE} ${MOVED}` },
    },
    'POST /edits/:id/ask': { ...deciding, id: 'askForChanges', summary: 'Gives an edit back with what to change.', body: ReasonInput.omit(withoutVersion) },
    'POST /edits/:id/decline': { ...deciding, id: 'declineEdit', summary: 'Declines an edit.', body: ReasonInput.omit(withoutVersion) },
    'POST /edits/:id/approve': {
      ...deciding,
      id: 'approveEdit',
      summary: 'Publishes exactly the version that was read, as the guide’s next edition.',
      body: DecisionInput.omit(withoutVersion),
      answers: { 200: { ...change.answers[200], says: 'Published.', body: ApprovalAnswer } },
      problems: { ...change.problems, 409: `${WRONG_STATE} ${MOVED} \`place_taken\`: approve once more. \`adjustable_gone\`.` },
    },
    'POST /edits/:id/notes': {
      id: 'addNote',
      summary: 'Adds a note for writer and moderators. It changes neither text nor version.',
      who: 'members',
      once: true,
      limited: true,
      params,
      body: NoteInput,
      answers: { 201: { says: 'The edit with the note.', body: EditAnswer } },
      problems: { 404: HIDDEN, 409: WRONG_STATE },
    },
    'POST /preview': {
      id: 'previewGuide',
      summary: 'A draft exactly as publishing would store it.',
      who: 'verified members',
      limited: true,
      body: PreviewInput,
      answers: { 200: { says: 'What the reader would see, and what to mend.', body: PreviewAnswer } },
      problems: { 422: 'The text cannot be laid out (`too_long`, `too_deep`, `too_many_tokens`, `too_heavy`, `timed_out`).', 503: 'Too many texts wait (`busy`).' },
    },
  },
}
