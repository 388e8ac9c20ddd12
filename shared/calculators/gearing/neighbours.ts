export { neighbourTable }

import { say } from '../sentence.ts'
import { finalDrive, type GearTeeth } from './drive.ts'
import type { CalculatorTable } from '../definition.ts'

/** Spurs are commonly sold in steps of two teeth, pinions in steps of one (common practice). */
const spurSteps = [-4, -2, 0, 2, 4]
const pinionSteps = [-2, -1, 0, 1, 2]

/** Final drive with the spurs and pinions that lie next to the reader's; gears that nobody makes are left out. */
function neighbourTable(
  teeth: GearTeeth,
  smallest: { spurTeeth: number; pinionTeeth: number },
): CalculatorTable {
  const spurs = spurSteps.map((step) => teeth.spurTeeth + step).filter((spur) => spur >= smallest.spurTeeth)
  const pinions = pinionSteps
    .map((step) => teeth.pinionTeeth + step)
    .filter((pinion) => pinion >= smallest.pinionTeeth)
  return {
    caption: 'Final drive with other spurs (down) and pinions (across). Less is longer: faster, and hotter',
    columns: pinions.map(String),
    ownColumn: pinions.indexOf(teeth.pinionTeeth),
    rows: spurs.map((spurTeeth) => ({
      label: say`${String(spurTeeth)}`,
      unit: '1',
      digits: 4,
      cells: pinions.map((pinionTeeth) => finalDrive({ ...teeth, spurTeeth, pinionTeeth })),
      ...(spurTeeth === teeth.spurTeeth && { own: true as const }),
    })),
  }
}
