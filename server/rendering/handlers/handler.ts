export type { DirectiveHandler, HandlerContext, Markup, PartWithoutNumber }

import type { Directive, DirectiveForm } from '../directives/directive.ts'
import type { CalculatorPart, EffectsPart, WorkedPart } from '#shared/rendering/parts.ts'
import type { VocabularyIndex } from '../vocabulary-index.ts'

/** HTML around what the directive holds; a directive that holds nothing has it all in `before`. */
interface Markup {
  before: string
  after: string
}

type PartWithoutNumber = Omit<CalculatorPart, 'n'> | Omit<EffectsPart, 'n'> | Omit<WorkedPart, 'n'>

/** What a handler may know and do while one directive is turned into HTML. */
interface HandlerContext {
  vocabulary: VocabularyIndex
  /** A link must not hold another link. */
  insideLink: boolean
  /** Tells the writer, at the directive's line. */
  report(code: string, message: string): void
  /** Puts a part into the body here; null, with the writer told, where none may stand. */
  addPart(part: PartWithoutNumber): Markup | null
}

/** One directive of the guide language. */
interface DirectiveHandler {
  name: string
  forms: readonly DirectiveForm[]
  /** Attribute keys it understands; 'any' when it checks them itself, against a calculator's inputs. */
  attributes: readonly string[] | 'any'
  /** What stands in the brackets: nothing, Markdown, or text that the handler reads itself. */
  label: 'none' | 'markdown' | 'raw'
  /**
   * @returns null when it cannot be shown; the directive is then printed as it was written, or what it holds
   * alone
   */
  toMarkup(directive: Directive, context: HandlerContext): Markup | null
}
