export { AXLES, axleNames }
export type { Axle }

/** Which end of the car an adjustable belongs to. */
const AXLES = ['front', 'centre', 'rear', 'whole'] as const
type Axle = (typeof AXLES)[number]

const axleNames: Record<Axle, string> = { front: 'Front', centre: 'Centre', rear: 'Rear', whole: 'Whole car' }
