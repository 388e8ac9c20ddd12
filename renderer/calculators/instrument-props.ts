export { calculatorLookup }
export type { InstrumentProps }

import type { InjectionKey } from 'vue'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { CarSheet } from '#shared/cars/car.ts'
import type { UnitChoices } from '#shared/units/unit-choices.ts'

/**
 * Everything an instrument is drawn from, as plain JSON: it travels in the page from the server to the
 * browser.
 */
interface InstrumentProps {
  slug: string
  /** The guide's values, in the calculator's units; keys left out take the listed defaults. */
  preset?: Record<string, number>
  /** Names the element, the fields and the parameters of this instrument; unique on its page. */
  instanceId: string
  /** This instrument's parameters of the address (`parametersFor` in shared/calculators/query.ts). */
  values?: Record<string, string>
  /** Path of the page, where the form goes and where the link points. */
  action?: string
  /** Units to begin with, before the address says otherwise. */
  units?: UnitChoices
  /** The chosen car of a signed-in reader; a visitor's is taken from the browser once a script runs. */
  car?: CarSheet
  /** The end of the car it is about, where the guide says so. */
  end?: CarEnd
  /** Level of the heading; 3 inside a guide's section. */
  headingLevel?: 2 | 3
}

/**
 * How an instrument finds its definition: on the server among all, in the browser only the one that was
 * loaded.
 */
const calculatorLookup: InjectionKey<(slug: string) => CalculatorDefinition> = Symbol('calculator lookup')
