export { aCar, createCar, newId, tag }

import { randomUUID } from 'node:crypto'
import type { Agent } from './edits-support.ts'
import type { CarView } from '#shared/schemas/car.ts'

const newId = () => randomUUID()

/** A car as a browser would send it. */
function aCar(change: Partial<Pick<CarView, 'id' | 'name' | 'carClass' | 'values'>> = {}) {
  const id = change.id ?? newId()
  return { name: `Car ${id.slice(0, 8)}`, carClass: null, values: {}, ...change, id }
}

async function createCar(agent: Agent, change: Parameters<typeof aCar>[0] = {}): Promise<CarView> {
  const answer = await agent.post('/api/cars').send(aCar(change))
  if (answer.status !== 201) throw new Error(`POST /api/cars: ${answer.status} ${answer.text.slice(0, 300)}`)
  return answer.body as CarView
}

function tag(car: { version: number }): [string, string] {
  return ['If-Match', `"${car.version}"`]
}
