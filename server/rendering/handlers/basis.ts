export { basisHandler }

import type { DirectiveHandler } from './handler.ts'

const BASES = new Map([
  ['physics', 'physics'],
  ['common_practice', 'common practice'],
  ['reported', 'reported'],
])

/** `:basis[text]{kind=physics}`: what kind of claim a passage is. */
const basisHandler: DirectiveHandler = {
  name: 'basis',
  forms: ['text'],
  attributes: ['kind'],
  label: 'markdown',
  toMarkup({ attributes }, context) {
    const kind = attributes.get('kind')
    const words = kind === undefined ? undefined : BASES.get(kind)
    if (kind === undefined || words === undefined) {
      context.report(
        'unknown_kind',
        `Say what the claim rests on: :basis[…]{kind=…} with one of ${[...BASES.keys()].join(', ')}.`,
      )
      return { before: '', after: '' }
    }
    return {
      before: `<span class="basis basis-${kind.replace('_', '-')}">`,
      after: ` <span class="basis-mark">${words}</span></span>`,
    }
  },
}
