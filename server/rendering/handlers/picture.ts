export { pictureHandler }

import type { DirectiveHandler } from './handler.ts'

/** `::picture{…}`: guides hold no pictures, so the writer is told and nothing is printed. */
const pictureHandler: DirectiveHandler = {
  name: 'picture',
  forms: ['leaf'],
  attributes: 'any',
  label: 'raw',
  toMarkup(_directive, context) {
    context.report(
      'no_pictures',
      'Guides hold no pictures. Nothing is shown here: say it in words, or take the line out.',
    )
    return { before: '', after: '' }
  },
}
