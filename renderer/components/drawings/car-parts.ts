export { carParts, spotOf }
export type { CarPart, Spot }

interface Spot {
  x: number
  y: number
}

/** One part of the plan of a four-wheel-drive buggy, front to the right, and the chapters it belongs to. */
interface CarPart {
  name: string
  chapters: string
  path: string
}

const tread = (x: number, y: number) =>
  [-34, -20, -6, 8, 22, 36].map((at) => `M${x + at} ${y - 23}v10M${x + at} ${y + 23}v-10M${x + at - 7} ${y - 5}v10`).join('')
const tyre = (x: number, y: number) => `M${x - 41} ${y - 23}h82q5 0 5 5v36q0 5-5 5h-82q-5 0-5-5v-36q0-5 5-5z`
const wheels: readonly (readonly [number, number])[] = [[240, 34], [240, 266], [896, 34], [896, 266]]
const teeth = (x: number, width: number, from: number, to: number) => {
  let path = ''
  for (let y = from; y <= to; y += 6) path += `M${x} ${y}h${width}`
  return path
}
/** An arm from its hinge pins at the gearbox to the hub. */
const arm = (x: number, side: -1 | 1, hub: number) =>
  `M${x - 34} ${150 + side * 40}L${hub - 6} ${150 + side * 84}M${x + 34} ${150 + side * 40}L${hub + 6} ${150 + side * 84}M${x - 40} ${150 + side * 40}h80`

const carParts: CarPart[] = [
  { name: 'body', chapters: '', path: 'M186 150C186 96 232 84 330 84H770C880 84 952 104 968 124V176C952 196 880 216 770 216H330C232 216 186 204 186 150Z' },
  { name: 'tyres', chapters: 'AF', path: wheels.map(([x, y]) => tyre(x, y)).join('') },
  { name: 'pins', chapters: 'A', path: wheels.map(([x, y]) => tread(x, y)).join('') },
  { name: 'driveshafts', chapters: 'B', path: 'M240 57V104M240 243V196M896 57V104M896 243V196' },
  { name: 'propshafts', chapters: 'B', path: 'M286 146H524M286 154H524M612 146H850M612 154H850' },
  { name: 'gearboxes', chapters: 'B', path: 'M220 116H270L286 136V164L270 184H220ZM916 116H866L850 136V164L866 184H916Z' },
  { name: 'diffs', chapters: 'B', path: 'M234 126h12v48h-12zM246 130L258 142V158L246 170M902 126h-12v48h12zM890 130L878 142V158L890 170M573 126h23v48h-23z' },
  { name: 'centre brakes', chapters: 'B', path: 'M524 116h16v68h-16zM596 116h16v68h-16zM540 146H560M540 154H560' },
  { name: 'spur', chapters: 'BG', path: `M560 94h12v110h-12z${teeth(560, 12, 98, 200)}` },
  { name: 'pinion', chapters: 'G', path: `M559 206h14v32h-14z${teeth(559, 14, 211, 233)}M573 222H592` },
  { name: 'motor', chapters: 'G', path: 'M597 194h102q5 0 5 5v46q0 5-5 5h-102q-5 0-5-5v-46q0-5 5-5zM606 194V250M690 194V250' },
  { name: 'arms', chapters: 'CE', path: `${arm(240, -1, 240)}${arm(240, 1, 240)}${arm(896, -1, 896)}${arm(896, 1, 896)}` },
  { name: 'links', chapters: 'C', path: 'M262 104L252 64M262 196L252 236M874 104L884 64M874 196L884 236' },
  { name: 'steering', chapters: 'C', path: 'M806 130h24v40h-24zM830 138L908 66M830 162L908 234' },
  { name: 'sway bars', chapters: 'E', path: 'M214 72L204 96V204L214 228M922 72L932 96V204L922 228' },
  { name: 'shocks', chapters: 'D', path: 'M288 76h16v34h-16zM292 110v12h8v-12M288 84h16M288 92h16M288 100h16M288 224h16v-34h-16zM292 190v-12h8v12M288 216h16M288 208h16M288 200h16M832 76h16v34h-16zM836 110v12h8v-12M832 84h16M832 92h16M832 100h16M832 224h16v-34h-16zM836 190v-12h8v12M832 216h16M832 208h16M832 200h16' },
  { name: 'battery', chapters: 'FH', path: 'M352 184h140v40h-140zM492 198h7v12h-7M372 184v40M396 204h24M408 192v24' },
  { name: 'wing', chapters: 'E', path: 'M128 84h30v132h-30zM158 128h28M158 172h28' },
]

const FRONT = 896
const REAR = 240

/** Where on the plan an adjustable works. The upper half of the drawing stands for both sides. */
const spots: Record<string, Spot> = {
  front_diff_fluid: { x: 884, y: 150 },
  centre_diff_fluid: { x: 584, y: 150 },
  rear_diff_fluid: { x: 252, y: 150 },
  pinion: { x: 566, y: 222 },
  battery_position: { x: 408, y: 204 },
  ballast: { x: 470, y: 204 },
  chassis_brace: { x: 700, y: 150 },
  wheelbase: { x: REAR, y: 216 },
  ackermann: { x: 818, y: 150 },
  bump_steer: { x: 868, y: 102 },
  servo_saver: { x: 818, y: 150 },
  steering_end_point: { x: 818, y: 150 },
  caster: { x: FRONT, y: 80 },
  kick_up: { x: 930, y: 110 },
  anti_squat: { x: 274, y: 110 },
  wing_angle: { x: 143, y: 150 },
  wing_mount: { x: 143, y: 120 },
  drag_brake: { x: 648, y: 222 },
  throttle_punch: { x: 648, y: 222 },
  brake_strength: { x: 532, y: 150 },
  tyre_compound: { x: FRONT, y: 34 },
  tyre_tread: { x: REAR, y: 34 },
  tyre_insert: { x: REAR, y: 266 },
}

/** For adjustables that either axle has, by the word after `front_` or `rear_`: its height on the plan and distance inwards. */
const axleSpots: Record<string, Spot> = {
  sway_bar: { x: -36, y: 150 },
  toe: { x: 0, y: 57 },
  camber: { x: 0, y: 46 },
  ride_height: { x: 40, y: 130 },
  droop: { x: 0, y: 96 },
  hinge_pin_height: { x: 0, y: 110 },
  camber_link_length: { x: 17, y: 84 },
  camber_link_inner: { x: 22, y: 104 },
  shock_oil: { x: 56, y: 93 },
  piston: { x: 56, y: 116 },
  spring: { x: 56, y: 93 },
  shock_tower_mount: { x: 56, y: 78 },
  shock_arm_mount: { x: 56, y: 120 },
  track: { x: 0, y: 20 },
}

/** The place on the plan of an adjustable's key; undefined for one that has no place on a car seen from above. */
function spotOf(adjustable: string): Spot | undefined {
  const known = spots[adjustable]
  if (known !== undefined) return known
  const [, axle, part] = /^(front|rear)_(.+)$/.exec(adjustable) ?? []
  const place = part === undefined ? undefined : axleSpots[part]
  if (place === undefined) return undefined
  return { x: axle === 'front' ? FRONT - place.x : REAR + place.x, y: place.y }
}
