export { withoutEmptyRows }

import type { GuideDraft } from '../schemas/guide-content.ts'

/** A draft without the short answers and sources that were opened in the form and left blank. */
function withoutEmptyRows(guide: GuideDraft): GuideDraft {
  return {
    ...guide,
    answers: guide.answers.filter((answer) => answer.heading !== '' || answer.text !== ''),
    sources: guide.sources.filter((source) => source.text !== '' || source.url !== ''),
  }
}
