export { byPart, partLetters, partNames }

import type { CalculatorPart } from '#shared/calculators/definition.ts'

/** Parts of the car in the order of the book's chapters. */
const partNames: Record<CalculatorPart, string> = {
  tyres: 'Tyres and wheels',
  driveline: 'Diffs and driveline',
  'wheel angles': 'Wheel angles',
  'springs and shocks': 'Springs and shocks',
  'ride height and movement': 'How the car sits and moves',
  weight: 'Weight',
  'motor and gearing': 'Motor and gearing',
  bench: 'The bench',
}

/** The chapter of the book about the same part. */
const partLetters: Record<CalculatorPart, string> = {
  tyres: 'A',
  driveline: 'B',
  'wheel angles': 'C',
  'springs and shocks': 'D',
  'ride height and movement': 'E',
  weight: 'F',
  'motor and gearing': 'G',
  bench: 'H',
}

interface PartGroup<T> {
  part: CalculatorPart
  letter: string
  name: string
  calculators: T[]
}

/** Calculators by the part of the car they are about; parts without one are left out. */
function byPart<T extends { part: CalculatorPart }>(calculators: readonly T[]): PartGroup<T>[] {
  return (Object.keys(partNames) as CalculatorPart[])
    .map((part) => ({
      part,
      letter: partLetters[part],
      name: partNames[part],
      calculators: calculators.filter((calculator) => calculator.part === part),
    }))
    .filter((group) => group.calculators.length > 0)
}
