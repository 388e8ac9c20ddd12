import { parse } from 'yaml'
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { spotOf } from './car-parts.ts'
import { placeCallouts } from './place-callouts.ts'

const guide = (mark: string, adjustables: string[], title = `Guide ${mark}`) => ({ mark, title, href: `/guides/${mark}`, adjustables })

describe('spotOf', () => {
  it('knows a place for every adjustable of the book', () => {
    const adjustables = parse(readFileSync('content/adjustables.yaml', 'utf8')) as { key: string }[]
    expect(adjustables.filter(({ key }) => spotOf(key) === undefined).map(({ key }) => key)).toEqual([])
  })

  it('puts front parts right of rear parts, as the car points right', () => {
    for (const part of ['diff_fluid', 'sway_bar', 'shock_oil', 'toe']) {
      expect(spotOf(`front_${part}`)!.x).toBeGreaterThan(spotOf(`rear_${part}`)!.x)
    }
  })
})

describe('placeCallouts', () => {
  it('leaves out guides that are about no part of the car', () => {
    expect(placeCallouts([guide('H3', []), guide('B1', ['front_diff_fluid'])]).map((callout) => callout.mark)).toEqual(['B1'])
  })

  it('gives every name room of its own, above and below', () => {
    const many = Array.from({ length: 9 }, (_, at) => guide(`E${at + 1}`, ['front_droop', 'rear_droop', 'wing_angle'], 'A title of some length here'))
    const callouts = placeCallouts(many)
    for (const above of [true, false]) {
      const xs = callouts.filter((callout) => callout.above === above).map((callout) => callout.x)
      expect([...xs].sort((a, b) => a - b)).toEqual(xs)
      expect(new Set(xs).size).toBe(xs.length)
    }
    expect(Math.max(...callouts.map((callout) => callout.lines.length))).toBeLessThanOrEqual(2)
  })

  it('draws one line to a place that two adjustables share', () => {
    expect(placeCallouts([guide('D1', ['front_shock_oil', 'front_spring'])])[0]!.spots).toHaveLength(1)
  })
})
