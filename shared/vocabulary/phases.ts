export { PHASES, phases }
export type { Phase }

/** The six parts of a lap, in the order in which a car meets them; order and numbers never change on any page. */
const PHASES = ['entry', 'middle', 'exit', 'straight', 'bumps', 'jumps'] as const
type Phase = (typeof PHASES)[number]

const phases: Record<Phase, { number: number; name: string; short: string; about: string }> = {
  entry: { number: 1, name: 'Corner entry', short: 'Entry', about: 'off power or braking into the corner' },
  middle: { number: 2, name: 'Mid-corner', short: 'Mid', about: 'rolling through the corner' },
  exit: { number: 3, name: 'Corner exit', short: 'Exit', about: 'on power out of the corner' },
  straight: { number: 4, name: 'Straight', short: 'Straight', about: 'flat out in a line' },
  bumps: { number: 5, name: 'Bumps', short: 'Bumps', about: 'over ruts and ripples' },
  jumps: { number: 6, name: 'Jumps', short: 'Jumps', about: 'take-off, flight and landing' },
}
