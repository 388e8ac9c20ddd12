export { copperWire, wireDiameter }

/** Copper of 100 % IACS at 20 °C in Ω·m, and how its resistance grows with temperature per K (IEC 60028). */
const resistivity = 1.7241e-8
const perKelvin = 0.00393

interface Lead {
  /** AWG number; the metal of a stranded wire has the same area as a solid one of that number. */
  gauge: number
  /** One way, mm. */
  length: number
  /** A */
  current: number
  /** °C */
  temperature: number
}

/** Diameter of solid wire of an American wire gauge number, mm (ASTM B258). */
function wireDiameter(gauge: number): number {
  return 0.127 * 92 ** ((36 - gauge) / 39)
}

/** Diameter (mm), and for both leads together resistance (mΩ), voltage drop (V) and heat (W). */
function copperWire({ gauge, length, current, temperature }: Lead) {
  const diameter = wireDiameter(gauge)
  const metres = (2 * length) / 1000
  const area = (Math.PI / 4) * (diameter / 1000) ** 2
  const ohms = (resistivity * (1 + perKelvin * (temperature - 20)) * metres) / area
  return { diameter, resistance: 1000 * ohms, voltageDrop: current * ohms, heat: current ** 2 * ohms }
}
