export { finalDrive, rollout }
export type { GearTeeth }

/** Teeth of the two steps between motor and wheels. Without a second step, its two numbers are 1. */
interface GearTeeth {
  spurTeeth: number
  pinionTeeth: number
  ringTeeth: number
  diffPinionTeeth: number
}

/** Turns of the motor for one turn of the wheels: driven over driving teeth, step by step. */
function finalDrive({ spurTeeth, pinionTeeth, ringTeeth, diffPinionTeeth }: GearTeeth): number {
  return (spurTeeth / pinionTeeth) * (ringTeeth / diffPinionTeeth)
}

/** How far the car moves in one turn of the motor, in the unit of the tyre's diameter. */
function rollout(tyreDiameter: number, teeth: GearTeeth): number {
  return (Math.PI * tyreDiameter) / finalDrive(teeth)
}
