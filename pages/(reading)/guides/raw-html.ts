export { RawHtml }

import { createStaticVNode, defineComponent } from 'vue'

/**
 * Stored HTML put out as it is, without an element round it, so that headings and paragraphs of a guide's body stand in the
 * page's own grid. Only for what the guide renderer made and sanitised; these pages are never hydrated.
 */
const RawHtml = defineComponent({
  name: 'RawHtml',
  props: { html: { type: String, required: true } },
  setup: (props) => () => createStaticVNode(props.html, 1),
})
