export { stepWords }

import { formatNumber } from '../units/format-number.ts'

const units: Record<string, (figure: string, one: boolean) => string> = {
  step: (figure, one) => (one ? 'one step' : `${figure} steps`),
  teeth: (figure, one) => (one ? 'one tooth' : `${figure} teeth`),
  deg: (figure) => `${figure}°`,
}

/** The usual small step in words, such as “2,000 cSt at a time”; units follow a no-break space. */
function stepWords({ smallStep, unit }: { smallStep: number; unit: string }): string {
  const figure = formatNumber(smallStep, 6)
  const words = units[unit]?.(figure, smallStep === 1) ?? `${figure}\u00A0${unit}`
  return `${words.replace(' ', '\u00A0')} at a time`
}
