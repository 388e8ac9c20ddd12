export { cautionHandler }

import type { DirectiveHandler } from './handler.ts'

/** What can hurt, with the words and the mark it is shown by. */
const CAUTION_KINDS = new Map([
  ['lithium', { label: 'Lithium battery', mark: 'mk-cell' }],
  ['spinning', { label: 'Spinning parts', mark: 'mk-gear' }],
  ['heat', { label: 'Hot parts', mark: 'mk-heat' }],
  ['solvent', { label: 'Solvent', mark: 'mk-bottle' }],
  ['soldering', { label: 'Soldering', mark: 'mk-iron' }],
  ['cutting', { label: 'Cutting tools', mark: 'mk-blade' }],
  ['eyes', { label: 'Eyes', mark: 'mk-eye' }],
])

/**
 * `:::caution{kind=lithium}` … `:::`: a passage on something that can injure or burn. A caution whose kind is
 * missing or misspelt is still shown as a caution: leaving the yellow out would be the dangerous way to fail.
 */
const cautionHandler: DirectiveHandler = {
  name: 'caution',
  forms: ['container'],
  attributes: ['kind'],
  label: 'none',
  toMarkup({ attributes }, context) {
    const given = attributes.get('kind')
    const kind = given === undefined ? undefined : CAUTION_KINDS.get(given)
    if (kind === undefined) {
      context.report(
        'unknown_kind',
        `Say what can hurt: :::caution{kind=…} with one of ${[...CAUTION_KINDS.keys()].join(', ')}.`,
      )
    }
    const name = kind === undefined ? 'Caution' : `Caution: ${kind.label}`
    const kindLine = kind === undefined ? '' : `<p class="caution-k">${mark(kind.mark)}${kind.label}</p>`
    return {
      before: `<aside class="caution" role="note" aria-label="${name}">`
        + `<span class="caution-m">${mark('mk-caution')}<span>Caution</span></span><div class="caution-b">${kindLine}`,
      after: '</div></aside>\n',
    }
  },
}

/** The drawing comes from the style sheet, so that stored HTML needs no SVG. */
function mark(name: string): string {
  return `<span class="mk ${name}" aria-hidden="true"></span>`
}
