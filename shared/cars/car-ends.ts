export { CAR_ENDS, carEndNames }
export type { CarEnd }

const CAR_ENDS = ['front', 'centre', 'rear'] as const
/** Which end of the car a value belongs to. */
type CarEnd = (typeof CAR_ENDS)[number]
const carEndNames: Record<CarEnd, string> = { front: 'Front', centre: 'Centre', rear: 'Rear' }
