export { description }

import type { PageContextServer } from 'vike/types'
import { phases } from '#shared/vocabulary/phases.ts'
import type { Data } from './+data.ts'

function description({ data: { phase } }: PageContextServer<Data>): string {
  const { name, about } = phases[phase]
  return `${name}, ${about}: every change in the book that acts there, by what you want from the car, with its step, its strength and the minutes it takes.`
}
