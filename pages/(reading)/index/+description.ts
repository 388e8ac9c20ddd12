export { description }

import type { PageContextServer } from 'vike/types'

function description({ club }: PageContextServer): string {
  return `What is the car doing, and what do you change by how much? The tuning book of ${club}: guides written by racers, checked by moderators, with the numbers worked out in the page.`
}
