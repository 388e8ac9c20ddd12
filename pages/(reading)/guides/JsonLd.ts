export { JsonLd }

import { h, type FunctionalComponent } from 'vue'
import { jsonForScript } from './json-ld.ts'

/** Data for machines in the head of a page. A template cannot hold a script element, so this is a function. */
const JsonLd: FunctionalComponent<{ value: unknown }> = ({ value }) =>
  h('script', { type: 'application/ld+json', innerHTML: jsonForScript(value) })
JsonLd.props = ['value']
