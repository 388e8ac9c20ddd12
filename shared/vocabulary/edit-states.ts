export { EDIT_STATES, OPEN_EDIT_STATES, editStateNames, isOpenEditState, canChangeState }
export type { EditState, EditAction }

const EDIT_STATES = ['draft', 'in_review', 'changes_asked', 'approved', 'declined', 'withdrawn'] as const
type EditState = (typeof EDIT_STATES)[number]

/** States in which an edit is still being worked on by somebody. */
const OPEN_EDIT_STATES = ['draft', 'in_review', 'changes_asked'] as const satisfies readonly EditState[]

const editStateNames: Record<EditState, string> = {
  draft: 'Draft',
  in_review: 'Waiting for review',
  changes_asked: 'Changes asked for',
  approved: 'Approved',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
}

/** What can be done to an edit; `save` keeps its state. */
type EditAction = 'save' | 'send' | 'withdraw' | 'approve' | 'ask' | 'decline'

/** The only steps there are; every other one is a conflict (409). */
const from: Record<EditAction, readonly EditState[]> = {
  save: ['draft', 'changes_asked'],
  send: ['draft', 'changes_asked'],
  withdraw: ['draft', 'in_review', 'changes_asked'],
  approve: ['in_review'],
  ask: ['in_review'],
  decline: ['in_review'],
}

function canChangeState(state: EditState, action: EditAction): boolean {
  return from[action].includes(state)
}

function isOpenEditState(state: EditState): boolean {
  return (OPEN_EDIT_STATES as readonly EditState[]).includes(state)
}
