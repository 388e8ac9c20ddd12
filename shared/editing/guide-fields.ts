export { guideTextFields }

import type { GuideDraft } from '../schemas/guide-content.ts'

interface GuideTextField {
  field: string
  label: string
  text: string
}

/** The one-line texts of a guide with the names that stand above them; always the same list in the same order. */
function guideTextFields(guide: GuideDraft): GuideTextField[] {
  const answer = (n: number) => guide.answers[n] ?? { heading: '', text: '' }
  return [
    { field: 'title', label: 'Title', text: guide.title },
    { field: 'inShort', label: 'In short', text: guide.inShort },
    { field: 'answers.0.heading', label: 'First short answer, heading', text: answer(0).heading },
    { field: 'answers.0.text', label: 'First short answer', text: answer(0).text },
    { field: 'answers.1.heading', label: 'Second short answer, heading', text: answer(1).heading },
    { field: 'answers.1.text', label: 'Second short answer', text: answer(1).text },
    { field: 'bench.reachFor', label: 'When to reach for it', text: guide.bench.reachFor },
    { field: 'bench.moveBy', label: 'How much to move it', text: guide.bench.moveBy },
    { field: 'bench.youGiveUp', label: 'What you give up', text: guide.bench.youGiveUp },
    { field: 'bench.takes', label: 'How long it takes', text: guide.bench.takes },
  ]
}
