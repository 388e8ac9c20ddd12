export { shearModulusInput, steelShearModulus, steelYoungsModulus, youngsModulusInput }

import type { CalculatorInput } from '../definition.ts'

/**
 * Stiffness of music wire (ASTM A228) against shear and against stretch, GPa. Handbooks give 80 to 82.7 GPa
 * for the first, falling with the thickness of the wire; 79.3 (11.5 million psi) is the value most used.
 */
const steelShearModulus = 79.3
const steelYoungsModulus = 207

const reason = 'that is where metals for springs lie, from the lightest alloys to steel'

const shearModulusInput: CalculatorInput<'shearModulus'> = {
  key: 'shearModulus',
  label: 'Shear modulus of the wire',
  unit: 'GPa',
  default: steelShearModulus,
  min: 15,
  max: 100,
  step: 1,
  reason,
  help: 'Leave it for steel. Titanium is near 42, stainless spring wire near 69.',
}

const youngsModulusInput: CalculatorInput<'youngsModulus'> = {
  key: 'youngsModulus',
  label: 'Young’s modulus of the wire',
  unit: 'GPa',
  default: steelYoungsModulus,
  min: 40,
  max: 250,
  step: 1,
  reason,
  help: 'Leave it for steel. Titanium is near 110.',
}
