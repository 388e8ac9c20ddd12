export { MathFormula }

import { h, type FunctionalComponent, type VNode } from 'vue'
import type { MathNode } from '#shared/calculators/mathml.ts'

/**
 * A formula as a <math> element; browsers and screen readers know MathML Core, so it needs no script and no
 * fonts of its own.
 */
const MathFormula: FunctionalComponent<{ formula: MathNode }> = ({ formula }) => draw(formula)
MathFormula.props = ['formula']

function draw({ tag, text, children = [], displaystyle }: MathNode): VNode {
  const attributes = displaystyle ? { displaystyle: 'true' } : null
  return text === undefined ? h(tag, attributes, children.map(draw)) : h(tag, attributes, text)
}
