export { changeInWords }

import { figure, say, type Sentence } from '../sentence.ts'

/**
 * How much more or less something becomes, to end a sentence: `changeInWords(1.38, 'stiffer', 'softer',
 * 'as stiff')` is “38 % stiffer”, for 0.8 “20 % softer”; where nobody could tell the difference (under 0.05 %)
 * it is `same`.
 */
function changeInWords(ratio: number, more: string, less: string, same: string): Sentence {
  const share = Math.abs(ratio - 1) * 100
  if (share < 0.05) return [same]
  return say`${figure(share, '%', share < 1 ? 1 : share < 100 ? 2 : 3)} ${ratio > 1 ? more : less}`
}
