export { Rendering }

import type { RenderedPart } from '#shared/rendering/parts.ts'
import type { Heading, RenderProblem } from '../types.ts'
import type { VocabularyIndex } from '../vocabulary-index.ts'

const MAX_PROBLEMS = 50

/** What is gathered while one body is rendered. */
class Rendering {
  readonly vocabulary: VocabularyIndex
  readonly parts: RenderedPart[] = []
  readonly headings: Heading[] = []
  readonly problems: RenderProblem[] = []

  constructor(vocabulary: VocabularyIndex) {
    this.vocabulary = vocabulary
  }

  /** Tells the writer; after fifty problems one line stands for the rest. */
  report(line: number, code: string, message: string): void {
    if (this.problems.length < MAX_PROBLEMS) {
      this.problems.push({ line, code, message })
    } else if (this.problems.length === MAX_PROBLEMS) {
      const rest = 'There are more problems below this line. Mend these first.'
      this.problems.push({ line, code: 'more_problems', message: rest })
    }
  }
}
