export { guideMarks }
export type { MarkGroup }

import type { MarkName } from '#renderer/icons/marks.ts'
import { CAUTION_KINDS, cautions, type CautionKind } from '#shared/vocabulary/cautions.ts'
import type { Mark } from './insert-mark.ts'

interface MarkGroup {
  key: string
  name: string
  icon: MarkName
  /** What it is for, in a sentence for the list that stands there without a script. */
  about: string
  /** One choice is put in at once; several open a list. */
  choices: { key: string; name: string; mark: Mark }[]
}

interface Known {
  calculators: readonly {
    slug: string
    title: string
    inputs: readonly { key: string; default: number }[]
    /** What it answers, and with its starting values. */
    output: string
    answer: number
  }[]
  adjustables: readonly { key: string; name: string }[]
}

/** A skeleton of each caution: the order, then the reason. */
const cautionWords: Record<CautionKind, { order: string; reason: string }> = {
  lithium: { order: 'Charge where you can see it.', reason: 'A cell that is hurt can burn minutes later.' },
  spinning: { order: 'Unplug the motor first.', reason: 'A lost signal can spin the wheels up.' },
  heat: { order: 'Let it cool before you touch it.', reason: 'A motor can be hot enough to burn.' },
  solvent: { order: 'Work with the door open.', reason: 'Follow the maker’s instructions on the can.' },
  soldering: { order: 'Hold the part, not the wire.', reason: 'Solder stays hot longer than it shines.' },
  cutting: { order: 'Cut away from your hand.', reason: 'A blade slips when the plastic gives.' },
  eyes: { order: 'Put glasses on.', reason: 'Clips and chips fly.' },
}

/** What can be put into a guide's text, in the order of the spine. */
function guideMarks({ calculators, adjustables }: Known): MarkGroup[] {
  const first = adjustables[0]?.key ?? ''
  const presets = (inputs: Known['calculators'][number]['inputs']) => inputs.map(({ key, default: value }) => `${key}=${value}`).join(' ')
  return [
    {
      key: 'calculator', name: 'Calculator', icon: 'calc', about: 'A calculator with your starting values.',
      choices: calculators.map(({ slug, title, inputs }) => ({
        key: slug, name: title, mark: block(`::calculator{slug=${slug} |${presets(inputs)}|}`),
      })),
    },
    {
      key: 'worked', name: 'Worked', icon: 'check', about: 'A worked example with its answer, run again at every review.',
      choices: calculators.map(({ slug, title, inputs, output, answer }) => ({
        key: slug, name: title, mark: block(`::worked{calculator=${slug} ${presets(inputs)} expect=${output}:|${answer}| tolerance=1%}`),
      })),
    },
    {
      key: 'caution', name: 'Caution', icon: 'caution', about: 'Where someone can get hurt: the order first, then the reason.',
      choices: CAUTION_KINDS.map((kind) => ({
        key: kind, name: cautions[kind].name,
        mark: block(`:::caution{kind=${kind}}\n|${cautionWords[kind].order}| ${cautionWords[kind].reason}\n:::`),
      })),
    },
    {
      key: 'effects', name: 'Lap line', icon: 'rows', about: 'The lap line of one adjustable, inside the text.',
      choices: [{ key: 'effects', name: 'Lap line', mark: block(`::effects{adjustable=|${first}|}`) }],
    },
    {
      key: 'term', name: 'Term', icon: 'chapters', about: 'A word with its entry in the glossary.',
      choices: [{ key: 'term', name: 'Term', mark: inline(':term[|droop|]') }],
    },
    {
      key: 'basis', name: 'Basis', icon: 'source', about: 'What kind of claim a passage is.',
      choices: [
        { key: 'physics', name: 'Physics', mark: inline(':basis[|what follows from the physics|]{kind=physics}') },
        { key: 'common_practice', name: 'Common practice', mark: inline(':basis[|what most racers do|]{kind=common_practice}') },
        { key: 'reported', name: 'Reported by members', mark: inline(':basis[|what members report|]{kind=reported}') },
      ],
    },
    {
      key: 'formula', name: 'Formula', icon: 'plus', about: 'A formula, written in TeX.',
      choices: [
        { key: 'inline', name: 'In the sentence', mark: inline(':formula[|F = m a|]') },
        { key: 'block', name: 'On a line of its own', mark: block('::formula[|F = m a|]') },
      ],
    },
  ]
}

function block(skeleton: string): Mark {
  return { skeleton, block: true }
}

function inline(skeleton: string): Mark {
  return { skeleton, block: false }
}
