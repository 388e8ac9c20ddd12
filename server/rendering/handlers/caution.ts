export { cautionHandler }

import { CAUTION_KINDS, cautions, isCautionKind } from '#shared/vocabulary/cautions.ts'
import type { DirectiveHandler } from './handler.ts'

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
    const kind = isCautionKind(given) ? cautions[given] : undefined
    if (kind === undefined) {
      context.report(
        'unknown_kind',
        `Say what can hurt: :::caution{kind=…} with one of ${CAUTION_KINDS.join(', ')}.`,
      )
    }
    const name = kind === undefined ? 'Caution' : `Caution: ${kind.name}`
    const kindLine = kind === undefined ? '' : `<p class="caution-k">${mark(`mk-${kind.mark}`)}${kind.name}</p>`
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
