export { lapAcross, lapFlight, lapLanding, pieces }

import type { Phase } from '#shared/vocabulary/phases.ts'

/** The lap from left to right in six equal parts of 100, 72 high: through the corner, along the straight, over bumps, to the jump. */
const lapAcross =
  'M0 22H20C50 22 70 30 100 44C120 53.3 135 58 150 58S180 53.3 200 44C230 30 250 22 280 22H404C410 22 411 12 417 12' +
  'S425 32 432 32S441 12 448 12S456 32 463 32S472 12 479 12S488 22 496 22H514C534 22 541 4 550 0'
const lapLanding = 'M580 20C587 24 592 22 600 22'
const lapFlight = 'M550 0C560 -8 572 0 580 18'

/** The same lap in pieces that run down a page, each 48 by 100; both ends stand upright so that they meet at any height. */
const pieces: Record<Phase, { road: string; flight?: string }> = {
  entry: { road: 'M14 0V10C14 55 29 55 29 100' },
  middle: { road: 'M29 0C29 22 37 30 37 50S29 78 29 100' },
  exit: { road: 'M29 0C29 45 14 45 14 90V100' },
  straight: { road: 'M14 0V100' },
  bumps: { road: 'M14 0C14 9 8 12 8 22S20 38 20 50S8 66 8 78S14 92 14 100' },
  jumps: { road: 'M14 0V14C14 30 9 34 8 44M13 80C15 87 14 92 14 100', flight: 'M8 44C5 56 8 68 13 80' },
}
