export { SOURCE_KINDS, sourceKinds }
export type { SourceKind }

/** What stands behind a claim, said honestly beside it. */
const SOURCE_KINDS = [
  'standard',
  'book',
  'paper',
  'maker',
  'measurement',
  'common_practice',
  'from_memory',
] as const
type SourceKind = (typeof SOURCE_KINDS)[number]

const sourceKinds: Record<SourceKind, string> = {
  standard: 'Standard',
  book: 'Book',
  paper: 'Paper',
  maker: 'Maker’s data',
  measurement: 'Measured by members',
  common_practice: 'Common practice',
  from_memory: 'From memory, not looked up',
}
