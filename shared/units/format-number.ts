export { formatNumber }

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/**
 * A number for reading: rounded to `digits` significant digits, thousands with a comma, U+2212 for minus, no
 * trailing zeros. From 10¹⁵ up and below 10⁻⁶ it is written with a power of ten. Whole numbers written this
 * way are read back by `parseNumber` as the same number. Throws RangeError for NaN and the infinities: a
 * missing answer is never shown as a number.
 */
function formatNumber(value: number, digits = 4): string {
  if (!Number.isFinite(value)) throw new RangeError('Only a finite number can be shown.')
  const rounded = Number(value.toPrecision(digits))
  if (rounded === 0) return '0'
  const size = Math.abs(rounded)
  const sign = rounded < 0 ? '−' : ''
  const exponent = Math.floor(Math.log10(size))
  if (exponent >= 15 || exponent < -6) return sign + scientific(size, digits)
  const decimals = Math.max(0, digits - 1 - exponent)
  const [whole = '', fraction = ''] = size.toFixed(Math.min(decimals, 100)).split('.')
  const kept = fraction.replace(/0+$/, '')
  return sign + whole.replace(/\B(?=(\d{3})+$)/g, ',') + (kept === '' ? '' : `.${kept}`)
}

function scientific(size: number, digits: number): string {
  const [mantissa = '', power = '0'] = size.toExponential(digits - 1).split('e')
  const short = mantissa.includes('.') ? mantissa.replace(/\.?0+$/, '') : mantissa
  const raised = power
    .replace('+', '')
    .replace('-', '⁻')
    .replace(/\d/g, (digit) => superscripts[Number(digit)] ?? '')
  return `${short}\u00A0×\u00A010${raised}`
}
