export { createSanitiser }

import createDOMPurify from 'dompurify'
import type { WindowLike } from 'dompurify'
import { JSDOM } from 'jsdom'
import { ALLOWED_ELEMENTS, SAFE_ADDRESS } from './sanitise-profile.ts'

/**
 * The last step before HTML is stored. The HTML it gets is already the renderer's own, with every word of a
 * member's escaped; it stands there so that a slip in any step before it cannot reach a reader's browser.
 *
 * Making one is slow (it starts a whole DOM), so each worker makes one and keeps it.
 */
function createSanitiser(): (html: string) => string {
  const purify = createDOMPurify(new JSDOM('').window as unknown as WindowLike)
  const attributeNames = new Set([...ALLOWED_ELEMENTS.values()].flatMap((attributes) => Object.keys(attributes)))

  // DOMPurify's lists allow an attribute on every element; ours are per element and look at the value.
  purify.addHook('uponSanitizeAttribute', (element, attribute) => {
    const { attrName, attrValue } = attribute
    const allowed = ALLOWED_ELEMENTS.get(element.nodeName.toLowerCase()) ?? {}
    attribute.keepAttr = Object.hasOwn(allowed, attrName) && allowed[attrName]!.test(attrValue)
  })

  return (html) =>
    purify.sanitize(html, {
      ALLOWED_TAGS: [...ALLOWED_ELEMENTS.keys()],
      ALLOWED_ATTR: [...attributeNames],
      ALLOWED_URI_REGEXP: SAFE_ADDRESS,
      // DOMPurify takes every other attribute for an address too, unless told.
      ADD_URI_SAFE_ATTR: [...attributeNames].filter((name) => name !== 'href'),
      ALLOW_DATA_ATTR: false,
      ALLOW_ARIA_ATTR: false,
      ALLOW_UNKNOWN_PROTOCOLS: false,
      SANITIZE_DOM: true,
    })
}
