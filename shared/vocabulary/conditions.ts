export { BITES, CAR_CLASSES, SURFACES, bites, carClasses, surfaces }
export type { Bite, CarClass, Surface }

const SURFACES = [
  'loose',
  'loam',
  'hard_packed',
  'blue_groove',
  'dusty',
  'wet',
  'artificial_turf',
  'carpet',
] as const
type Surface = (typeof SURFACES)[number]

const surfaces: Record<Surface, string> = {
  loose: 'Loose',
  loam: 'Loam',
  hard_packed: 'Hard-packed',
  blue_groove: 'Blue groove',
  dusty: 'Dusty',
  wet: 'Wet',
  artificial_turf: 'Artificial turf',
  carpet: 'Carpet',
}

const BITES = ['low', 'medium', 'high'] as const
type Bite = (typeof BITES)[number]

const bites: Record<Bite, string> = { low: 'Low bite', medium: 'Medium bite', high: 'High bite' }

const CAR_CLASSES = [
  'buggy_8e',
  'buggy_8n',
  'truggy_8',
  'buggy_10_4wd',
  'buggy_10_2wd',
  'truck_10',
  'short_course_10',
] as const
type CarClass = (typeof CAR_CLASSES)[number]

const carClasses: Record<CarClass, string> = {
  buggy_8e: '1/8 electric buggy',
  buggy_8n: '1/8 nitro buggy',
  truggy_8: '1/8 truggy',
  buggy_10_4wd: '1/10 4WD buggy',
  buggy_10_2wd: '1/10 2WD buggy',
  truck_10: '1/10 stadium truck',
  short_course_10: '1/10 short course truck',
}
