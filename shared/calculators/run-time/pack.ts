export { cellVoltage, minutesAt, packFigures }

/** Nominal voltage of the usual lithium cobalt and lithium nickel-manganese-cobalt cells (from memory). */
const cellVoltage = 3.7

interface Pack {
  /** mAh */
  capacity: number
  /** How much of it is driven, %. */
  usableShare: number
  /** A */
  averageCurrent: number
  cells: number
  /** Charge current over capacity in Ah, C. */
  chargeRate: number
}

/** Minutes that a share (%) of a capacity (mAh) lasts at a current (A). */
function minutesAt(capacity: number, share: number, current: number): number {
  return ((capacity / 1000) * (share / 100) * 60) / current
}

/**
 * What a pack gives and how it is charged. `energy` is of the whole pack; `chargeTime` is for the whole
 * capacity at constant current, without the slow end of the charge.
 */
function packFigures({ capacity, usableShare, averageCurrent, cells, chargeRate }: Pack) {
  const ampereHours = capacity / 1000
  return {
    runTime: minutesAt(capacity, usableShare, averageCurrent),
    energy: ampereHours * cells * cellVoltage,
    power: averageCurrent * cells * cellVoltage,
    dischargeRate: averageCurrent / ampereHours,
    chargeCurrent: ampereHours * chargeRate,
    chargeTime: 60 / chargeRate,
  }
}
