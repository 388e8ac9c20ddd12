export { carRanges }

/** What the values that calculators ask for under the same name can be, in the units of `carValues`; both ends inclusive. */
const carRanges = {
  mass: [0.5, 12],
  frontWeight: [20, 80],
  wheelbase: [100, 600],
  cgHeight: [5, 200],
  cells: [1, 14],
} as const
