export { findAmong, searchWords }

import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

/** Words that a question has and no answer needs. */
const fillers = new Set(
  'a an and are at be by can car do does for from get gets how i if in is it its much many my of on or should so that the this to what when where which why will with'.split(' '),
)

/** What people say for one another; a question that has one of a line finds all of it. */
const sameWords = [
  'hot heat warm temperature',
  'thick thin viscosity weight',
  'stiff soft hard rate',
  'fast speed quick',
  'battery pack lipo cell',
  'damper shock',
  'antirollbar stabiliser stabilizer sway arb',
  'shim spacer insert block',
  'heavy weigh mass scale',
  'lean roll',
  'gear gearing pinion spur',
].map((line) => line.split(' '))

/** Everything a calculator can be found by, as words with spaces between. */
function searchWords({
  title,
  purpose,
  keywords,
  inputs,
}: Pick<CalculatorDefinition, 'title' | 'purpose' | 'keywords' | 'inputs'>): string {
  const all = wordsIn([title, purpose, ...keywords, ...inputs.map(({ label }) => label)].join(' '))
  return [...new Set(all)].join(' ')
}

/**
 * Which of the entries a question in plain words is about. Part words, plurals and hyphens are forgiven. Where
 * no entry has all the words, those that have the most; all of them when nothing is asked.
 */
function findAmong<Entry extends { words: string }>(entries: readonly Entry[], question: string): Entry[] {
  const asked = [...new Set(wordsIn(question))].filter((word) => !fillers.has(word))
  if (asked.length === 0) return [...entries]
  const scored = entries.map((entry) => {
    const words = entry.words.split(' ')
    return { entry, score: asked.filter((word) => alike(word).some((one) => words.some((own) => meets(own, one)))).length }
  })
  const best = Math.max(...scored.map(({ score }) => score))
  return best === 0 ? [] : scored.filter(({ score }) => score === best).map(({ entry }) => entry)
}

/** Words without accents and capitals; a hyphenated one is its parts and the whole. */
function wordsIn(text: string): string[] {
  return text
    .normalize('NFD')
    .toLowerCase()
    .replace(/[\u0300-\u036f’']/g, '')
    .split(/[^\p{L}\p{N}-]+/u)
    .flatMap((word) => (word.includes('-') ? [...word.split('-'), word.replaceAll('-', '')] : [word]))
    .filter((word) => word !== '')
}

function alike(word: string): string[] {
  return [word, ...sameWords.filter((line) => line.some((own) => stem(own) === stem(word))).flat()]
}

/** “pin” meets “pinion”, “springs” meets “spring”, “thickness” meets “thick”. */
function meets(own: string, asked: string): boolean {
  const [word, part] = [stem(own), stem(asked)]
  return part.length < 3 ? word === part : word.startsWith(part) || (word.length > 3 && part.startsWith(word))
}

function stem(word: string): string {
  if (word.length > 4 && word.endsWith('ies')) return `${word.slice(0, -3)}y`
  return word.length > 3 && word.endsWith('s') && !word.endsWith('ss') ? word.slice(0, -1) : word
}
