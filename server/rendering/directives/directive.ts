export type { Directive, DirectiveForm }

/** `:name` inside a sentence, `::name` on a line of its own, `:::name` around blocks. */
type DirectiveForm = 'text' | 'leaf' | 'container'

/** One directive as written, before anything knows what its name means. */
interface Directive {
  form: DirectiveForm
  name: string
  /** What stands between the brackets, as written; null without brackets. */
  label: string | null
  attributes: Map<string, string>
  /** What is wrong with how it is written, in plain words; the rest of it still counts. */
  faults: string[]
  /** The directive as written (a container: its first line), shown when it means nothing. */
  source: string
}
