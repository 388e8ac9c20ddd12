export { balance, evened }
export type { CornerInputs, WheelLoads }

interface WheelLoads {
  frontLeft: number
  frontRight: number
  rearLeft: number
  rearRight: number
}
interface CornerInputs extends WheelLoads {
  wheelbase: number
  trackFront: number
  trackRear: number
}

/** Shares of the four readings (g) and the centre of gravity by moments (mm); the total must not be zero. */
function balance({ frontLeft, frontRight, rearLeft, rearRight, ...car }: CornerInputs) {
  const total = frontLeft + frontRight + rearLeft + rearRight
  const share = (grams: number) => (100 * grams) / total
  return {
    total,
    frontShare: share(frontLeft + frontRight),
    leftShare: share(frontLeft + rearLeft),
    crossWeight: share(frontRight + rearLeft),
    cgFromFrontAxle: (car.wheelbase * (rearLeft + rearRight)) / total,
    cgFromCentreLine:
      ((frontLeft - frontRight) * car.trackFront + (rearLeft - rearRight) * car.trackRear) / (2 * total),
  }
}

/**
 * The four readings once springs alone have made the diagonals even. Springs change neither the weight nor
 * where it sits, so what leaves a front wheel goes to the other front wheel, and the rear axle answers with
 * the opposite moment: on a wider axle by fewer grams.
 */
function evened(car: CornerInputs): WheelLoads {
  const { frontLeft, frontRight, rearLeft, rearRight, trackFront, trackRear } = car
  const tooMuch = (frontRight + rearLeft - frontLeft - rearRight) / 2
  const front = (tooMuch * trackRear) / (trackFront + trackRear)
  const rear = tooMuch - front
  return {
    frontLeft: frontLeft + front,
    frontRight: frontRight - front,
    rearLeft: rearLeft - rear,
    rearRight: rearRight + rear,
  }
}
