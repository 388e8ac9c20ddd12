import { describe, expect, it } from 'vitest'
import { placesFor } from './page-reader.ts'

const namesOf = (reader: Parameters<typeof placesFor>[0]) => placesFor(reader, '/').map((place) => place.name)

describe('placesFor', () => {
  it('shows the review desk to moderators and admins only', () => {
    expect(namesOf(null)).not.toContain('Review desk')
    expect(namesOf({ name: 'Tomasz', role: 'member', waiting: 3 })).not.toContain('Review desk')
    expect(namesOf({ name: 'Imre', role: 'moderator', waiting: 3 })).toContain('Review desk')
    expect(namesOf({ name: 'Wanda', role: 'admin' })).toContain('Review desk')
  })

  it('counts what waits only when something waits', () => {
    const desk = (waiting: number) => placesFor({ name: 'Imre', role: 'moderator', waiting }, '/').at(-1)
    expect(desk(3)?.count).toEqual({ figure: 3, words: '3 waiting' })
    expect(desk(0)?.count).toBeUndefined()
  })

  it.each([
    ['/', 'By feel'],
    ['/feel', 'By feel'],
    ['/lap/entry', 'By feel'],
    ['/chapters', 'Chapters'],
    ['/chapters/b', 'Chapters'],
    ['/guides/rear-toe', 'Chapters'],
    ['/calculators/fluid-blend', 'Calculators'],
    ['/write/12', 'Write'],
  ])('%s stands in %s', (path, name) => {
    expect(placesFor(null, path).filter((place) => place.current).map((place) => place.name)).toEqual([name])
  })

  it('is nowhere on a page outside the places', () => {
    expect(placesFor(null, '/sign-in').some((place) => place.current)).toBe(false)
    expect(placesFor(null, '/writers').some((place) => place.current)).toBe(false)
  })
})
