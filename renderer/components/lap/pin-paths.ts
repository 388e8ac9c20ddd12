export { hangingPin, standingPin, endClass }

/** A tyre pin standing on the line at `y`, its foot 10 wide beginning at `x`: more. */
function standingPin(x: number, y: number, height = 16): string {
  return `M${x} ${y}L${x + 2} ${y - height}H${x + 8}L${x + 10} ${y}Z`
}

/** The same pin hanging from the line: less. */
function hangingPin(x: number, y: number, height = 16): string {
  return standingPin(x, y, -height)
}

/** Clay for the front of the car, moss for the rear, ink for the whole; the quality's name says it too. */
function endClass(end: 'front' | 'rear' | 'whole'): string {
  return `e-${end}`
}
