import createMarkdownIt from 'markdown-it'
import type { Token } from 'markdown-it'
import { expect, test } from 'vitest'
import { directiveOf, directives } from './plugin.ts'

const md = new createMarkdownIt({ html: false }).use(directives, { hasRawLabel: (name: string) => name === 'raw' })

/** Tokens in short: directives as `form:name[label]{attributes}` and `/name`, words as they are, others by type. */
function outline(markdown: string): string {
  const walk = (tokens: Token[]): string[] => tokens.flatMap((token) => {
    const directive = directiveOf(token)
    if (token.type === 'directive_close') return [`/${directive!.name}`]
    if (directive !== undefined) {
      const attributes = [...directive.attributes].map(([key, value]) => `${key}=${value}`).join(' ')
      const fault = directive.faults.length > 0 ? '!' : ''
      return [`${directive.form}:${directive.name}${directive.label === null ? '' : `[${directive.label}]`}{${attributes}}${fault}`]
    }
    if (token.type === 'inline') return walk(token.children!)
    return token.type === 'text' ? (token.content === '' ? [] : [`“${token.content}”`]) : [token.type]
  })
  return walk(md.parse(markdown, {})).join(' ').replaceAll(/paragraph_open (.*?) paragraph_close/g, 'p($1)')
}

test.each([
  // inside a sentence
  ['a :term[droop] b', 'p(“a ” text:term[droop]{} “droop” /term “ b”)'],
  [':term[pushes]{key=push}', 'p(text:term[pushes]{key=push} “pushes” /term)'],
  [':x{a=1}', 'p(text:x{a=1})'],
  [':raw[\\frac{a}{b} *c* \\]]', 'p(text:raw[\\frac{a}{b} *c* \\]]{})'],
  [':x[a **b** c]', 'p(text:x[a **b** c]{} “a ” strong_open “b” strong_close “ c” /x)'],
  [':x[a :y[b] c]', 'p(text:x[a :y[b] c]{} “a ” text:y[b]{} “b” /y “ c” /x)'],
  [':x[`]`]', 'p(text:x[`]`]{} code_inline /x)'],
  ['*a :x[b* c]', 'p(“*a ” text:x[b* c]{} “b* c” /x)'],
  [':x[]', 'p(text:x[]{} /x)'],
  [':x[a]{b=c', 'p(text:x[a]{} “a” /x “{b=c”)'],
  // not directives
  ['12:30 and note: this', 'p(“12:30 and note: this”)'],
  ['a:x[b]', 'p(“a:x[b]”)'],
  [':x b', 'p(“:x b”)'],
  [':x[a', 'p(“:x[a”)'],
  ['\\:x[a]', 'p(“:x[a]”)'],
  ['`:x[a]`', 'p(code_inline)'],
  ['    ::x{a=1}', 'code_block'],
  ['```\n::x\n```', 'fence'],
  // on a line of their own
  ['::x', 'leaf:x{}'],
  ['::x[label *a*]{a=1 b="2 3"}', 'leaf:x[label *a*]{a=1 b=2 3}'],
  ['a\n::x{b=1}\nc', 'p(“a”) leaf:x{b=1} p(“c”)'],
  ['- a\n  ::x', 'bullet_list_open list_item_open p(“a”) leaf:x{} list_item_close bullet_list_close'],
  ['> ::x', 'blockquote_open leaf:x{} blockquote_close'],
  ['::x y', 'leaf:x{}!'],
  ['::x{a', 'leaf:x{}!'],
  [':: x', 'p(“:: x”)'],
  // around blocks
  [':::x{a=1}\nb\n:::', 'container:x{a=1} p(“b”) /x'],
  [':::x\n- a\n\n- b\n:::\nc', 'container:x{} bullet_list_open list_item_open p(“a”) list_item_close list_item_open p(“b”) list_item_close bullet_list_close /x p(“c”)'],
  ['::::x\n:::y\na\n:::\n::::', 'container:x{} container:y{} p(“a”) /y /x'],
  [':::x\na', 'container:x{}! p(“a”) /x'],
  ['> :::x\n> a\n\nb', 'blockquote_open container:x{}! p(“a”) /x blockquote_close p(“b”)'],
  ['- :::x\n  a\n  :::\n- b', 'bullet_list_open list_item_open container:x{} p(“a”) /x list_item_close list_item_open p(“b”) list_item_close bullet_list_close'],
  [':::', 'leaf:{}!'],
  [':::x\na\n::::', 'container:x{} p(“a”) /x'],
])('%j', (markdown, expected) => {
  expect(outline(markdown)).toBe(expected)
})
