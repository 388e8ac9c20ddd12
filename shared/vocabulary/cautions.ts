export { CAUTION_KINDS, cautions, isCautionKind }
export type { CautionKind }

/** What can hurt, with its words and the drawing it is shown by. */
const cautions = {
  lithium: { name: 'Lithium battery', mark: 'cell' },
  spinning: { name: 'Spinning parts', mark: 'gear' },
  heat: { name: 'Hot parts', mark: 'heat' },
  solvent: { name: 'Solvent', mark: 'bottle' },
  soldering: { name: 'Soldering', mark: 'iron' },
  cutting: { name: 'Cutting tools', mark: 'blade' },
  eyes: { name: 'Eyes', mark: 'eye' },
} as const

type CautionKind = keyof typeof cautions

const CAUTION_KINDS = Object.keys(cautions) as CautionKind[]

function isCautionKind(text: string | undefined): text is CautionKind {
  return text !== undefined && Object.hasOwn(cautions, text)
}
