import { expect, test } from 'vitest'
import { vocabulary } from './fixtures/vocabulary.ts'
import { createBodyRenderer } from './render-body.ts'

const renderBody = createBodyRenderer()
const render = (markdown: string) => renderBody(markdown, vocabulary)
const codes = (markdown: string) => render(markdown).problems.map(({ line, code }) => `${line} ${code}`)

test.each([
  ['plain words', 'a *b* **c** ~~d~~ `e`', '<p>a <em>b</em> <strong>c</strong> <s>d</s> <code>e</code></p>\n'],
  ['HTML as words', '<b onclick="x">a</b>', '<p>&lt;b onclick="x"&gt;a&lt;/b&gt;</p>\n'],
  ['a heading', '## Why *it* works', '<h2 id="s-why-it-works">Why <em>it</em> works</h2>\n'],
  ['an outside link', '[a](https://example.org "t")', '<p><a href="https://example.org/" rel="noopener nofollow ugc">a</a></p>\n'],
  ['a link on this site', '[a](/guides/droop)', '<p><a href="/guides/droop">a</a></p>\n'],
  ['a link to a heading', '[a](#b-c)\n\n## B, c', '<p><a href="#s-b-c">a</a></p>\n<h2 id="s-b-c">B, c</h2>\n'],
  ['no bare address as a link', 'https://example.org', '<p>https://example.org</p>\n'],
  ['an image as its words', '![a *b*](https://example.org/x.png)', '<p>a b</p>\n'],
  ['code', '```js\na < b\n```', '<pre role="region" tabindex="0" aria-label="Code"><code>a &lt; b\n</code></pre>\n'],
  ['a list from 3', '3. a\n4. b', '<ol start="3">\n<li>a</li>\n<li>b</li>\n</ol>\n'],
  [
    'a table', '|a||\n|-:|-|\n|1|2|',
    '<div class="table-scroll" role="region" tabindex="0" aria-label="Table"><table>\n<thead>\n<tr>\n'
    + '<th class="align-right" scope="col">a</th>\n<td></td>\n</tr>\n</thead>\n<tbody>\n<tr>\n'
    + '<td class="align-right">1</td>\n<td>2</td>\n</tr>\n</tbody>\n</table></div>\n',
  ],
  ['a term', ':term[Droop]', '<p><a class="term" href="/glossary#droop" data-term="droop">Droop</a></p>\n'],
  ['a term of two words', ':term[roll  centre]', '<p><a class="term" href="/glossary#roll-centre" data-term="roll-centre">roll  centre</a></p>\n'],
  ['a term in another form', ':term[pushes]{key=push}', '<p><a class="term" href="/glossary#push" data-term="push">pushes</a></p>\n'],
  ['a basis', ':basis[a **b**]{kind=common_practice}', '<p><span class="basis basis-common-practice">a <strong>b</strong> <span class="basis-mark">common practice</span></span></p>\n'],
  ['a formula', ':formula[\\frac{a}{b}]', '<p><span class="formula"><math><mrow><mfrac><mi>a</mi><mi>b</mi></mfrac></mrow></math></span></p>\n'],
  ['a formula with a bracket', ':formula[\\[0,1)]', '<p><span class="formula"><math><mrow><mo stretchy="false">[</mo><mn>0</mn><mo separator="true">,</mo><mn>1</mn><mo stretchy="false">)</mo></mrow></math></span></p>\n'],
  ['a formula on its own', '::formula[x^2]', '<div class="formula-block"><math display="block"><mrow><msup><mi>x</mi><mn>2</mn></msup></mrow></math></div>\n'],
  ['an unknown mark as written', 'a :x[b *c*]{d=e} f', '<p>a :x[b <em>c</em>]{d=e} f</p>\n'],
  ['an unknown block as written', '::x[b]{d="<"}', '<p>::x[b]{d="&lt;"}</p>\n'],
  ['what an unknown container holds', ':::x\na\n:::', '<p>a</p>\n'],
  ['no picture', '::picture{id=3}', ''],
])('renders %s', (_what, markdown, html) => {
  expect(render(markdown).html).toBe(html)
})

test('a caution opens with its order in bold', () => {
  const { html, problems } = render(':::caution{kind=lithium}\nUnplug the :term[droop]\nfirst. It burns.\n:::')
  expect(html).toBe(
    '<aside class="caution" role="note" aria-label="Caution: Lithium battery">'
    + '<span class="caution-m"><span class="mk mk-caution" aria-hidden="true"></span><span>Caution</span></span>'
    + '<div class="caution-b"><p class="caution-k"><span class="mk mk-cell" aria-hidden="true"></span>Lithium battery</p>'
    + '<p><strong>Unplug the <a class="term" href="/glossary#droop" data-term="droop">droop</a>\nfirst.</strong> It burns.</p>\n</div></aside>\n',
  )
  expect(problems).toEqual([])
})

test.each(['lithium', 'spinning', 'heat', 'solvent', 'soldering', 'cutting', 'eyes'])('there is a caution of kind %s', (kind) => {
  const { html, problems } = render(`:::caution{kind=${kind}}\n**Do.** Why.\n:::`)
  expect(problems).toEqual([])
  expect(html).toMatch(/<aside class="caution" role="note" aria-label="Caution: [A-Z][a-z ]+"><span class="caution-m"><span class="mk mk-caution" /)
  expect(html).toContain('<p><strong>Do.</strong> Why.</p>')
})

test('a caution of an unknown kind is still a caution', () => {
  const { html, problems } = render(':::caution{kind=lithum}\nDo.\n:::')
  expect(html).toContain('<aside class="caution" role="note" aria-label="Caution">')
  expect(problems).toMatchObject([{ line: 1, code: 'unknown_kind' }])
})

test('calculators, worked examples and lap lines become placeholders with their values', () => {
  const { html, parts, problems } = render([
    'a', '', '::effects{adjustable=front_diff_fluid}',
    '::calculator{slug=fluid-temperature viscosityAt25=7000 temperature=55 end=front}', '', 'b', '',
    '::worked{calculator=fluid-temperature viscosityAt25=7000 temperature=55 expect=viscosity:4.03e3 tolerance=2%}',
  ].join('\n'))
  expect(problems).toEqual([])
  expect(parts).toEqual([
    { n: 1, kind: 'effects', adjustable: 'front_diff_fluid' },
    { n: 2, kind: 'calculator', slug: 'fluid-temperature', preset: { viscosityAt25: 7000, temperature: 55 }, end: 'front' },
    {
      n: 3, kind: 'worked', slug: 'fluid-temperature', inputs: { viscosityAt25: 7000, temperature: 55 },
      expect: { key: 'viscosity', value: 4030 }, tolerance: 0.02,
    },
  ])
  expect(html).toBe(
    '<p>a</p>\n<div data-part="effects" data-n="1"></div>\n<div data-part="calculator" data-n="2"></div>\n'
    + '<p>b</p>\n<div data-part="worked" data-n="3"></div>\n',
  )
})

test.each([
  // [markdown, problems as "line code"]
  ['# a', ['1 heading_too_high']],
  ['## a\n\n#### b', ['3 heading_skips']],
  ['##', ['1 empty_heading']],
  ['a\n[b](javascript:c)', ['2 bad_link']],
  ['[](https://example.org)', ['1 empty_link']],
  ['a\n\n![b](c)', ['3 no_pictures']],
  ['::picture{id=1}', ['1 no_pictures']],
  ['a\nb :x[c]', ['2 unknown_directive']],
  ['::x', ['1 unknown_directive']],
  [':::x\n:::', ['1 unknown_directive']],
  ['::term[droop]', ['1 wrong_form']],
  [':caution[a]', ['1 wrong_form']],
  [':::calculator{slug=fluid-temperature}\n:::', ['1 wrong_form']],
  [':term[droop]{keys=droop}', ['1 unknown_attribute']],
  [':term[droop]{#a}', ['1 bad_directive']],
  [':::caution{kind=eyes}\nDo.', ['1 bad_directive']],
  [':::caution{kind=eyes}\n- Do.\n:::', ['1 caution_without_order']],
  [':::', ['1 bad_directive']],
  [':term[nothing]', ['1 unknown_term']],
  [':term[constructor]', ['1 unknown_term']],
  ['[a :term[droop]](https://example.org)', ['1 link_in_link']],
  [':term[[droop](/a)]{key=droop}', ['1 link_in_link']],
  [':basis[a]', ['1 unknown_kind']],
  [':basis[a]{kind=opinion}', ['1 unknown_kind']],
  ['::effects', ['1 missing_attribute']],
  ['::effects{adjustable=x}', ['1 unknown_adjustable']],
  ['::calculator', ['1 missing_attribute']],
  ['::calculator{slug=x}', ['1 unknown_calculator']],
  ['::calculator{slug=fluid-temperature a=1}', ['1 unknown_input']],
  ['::calculator{slug=fluid-temperature end=left}', ['1 unknown_end']],
  ['::calculator{slug=fluid-temperature temperature=warm}', ['1 not_a_number']],
  ['::calculator{slug=fluid-temperature temperature="1,000"}', ['1 not_a_number']],
  ['::calculator{slug=fluid-temperature temperature=121}', ['1 out_of_range']],
  ['::calculator[a]{slug=fluid-temperature}', ['1 unused_label']],
  ['- ::calculator{slug=fluid-temperature}', ['1 part_inside']],
  ['::worked{calculator=fluid-temperature}', ['1 missing_attribute']],
  ['::worked{calculator=fluid-temperature expect=x:1}', ['1 unknown_output']],
  ['::worked{calculator=fluid-temperature expect=viscosity:1 tolerance=1}', ['1 bad_tolerance']],
  ['::worked{calculator=fluid-temperature expect=viscosity:1 tolerance=50%}', ['1 bad_tolerance']],
  [':formula[\\frac{a}]', ['1 bad_formula']],
  [':formula[\\href{https://example.org}{a}]', ['1 bad_formula']],
  ['::formula', ['1 empty_formula']],
  [`:formula[${'x'.repeat(1001)}]`, ['1 long_formula']],
  [`:formula[${'\\sqrt{'.repeat(30)}x${'}'.repeat(30)}]`, ['1 deep_formula']],
  ['> - a\n>   :x[b]', ['2 unknown_directive']],
  ['::effects{adjustable=front_diff_fluid}\n'.repeat(31), ['31 too_many_parts']],
])('tells the writer about %j', (markdown, expected) => {
  expect(codes(markdown)).toEqual(expected)
})

test('many problems end in one line for the rest', () => {
  const { problems } = render('::x\n'.repeat(80))
  expect(problems).toHaveLength(51)
  expect(problems.at(-1)).toMatchObject({ line: 51, code: 'more_problems' })
})

test('headings have ids of their own and are listed, but not those inside quotes', () => {
  const { headings, html } = render('## A b\n\n### A b\n\n## A b 2\n\n> ## Q\n\n## Café')
  expect(headings).toEqual([
    { level: 2, id: 's-a-b', text: 'A b' },
    { level: 3, id: 's-a-b-2', text: 'A b' },
    { level: 2, id: 's-a-b-2-2', text: 'A b 2' },
    { level: 2, id: 's-cafe', text: 'Café' },
  ])
  expect(html).toContain('<h2 id="s-q">Q</h2>')
})

test('regions of one kind have different names', () => {
  const { html } = render('|a|\n|-|\n\nb\n\n|a|\n|-|')
  expect(html.match(/aria-label="[^"]+"/g)).toEqual(['aria-label="Table"', 'aria-label="Table 2"'])
})

test('plain text is the words alone', () => {
  const { plainText } = render('## A *b*\n\nc [d](/e)\n:term[droop] <b>\n\n- f\n\n```\ng\n```\n\n::effects{adjustable=front_diff_fluid}')
  expect(plainText).toBe('A b\nc d droop <b>\nf\ng')
})
