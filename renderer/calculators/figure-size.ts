export { figureWidth, letter, multipleWidth, round }

/**
 * Drawings and plots are laid out this many units wide, which is what a phone has for them: a letter of 14 px
 * then stays 14 px. Where there is more room the style sheet makes letters smaller in units, never larger.
 */
const figureWidth = 360
/** A plot among several. */
const multipleWidth = 250
/** Room for a letter of 14 px, in units of the drawing. */
const letter = 7.6

function round(value: number): number {
  return Math.round(value * 10) / 10
}
