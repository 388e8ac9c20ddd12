import { describe, expect, it } from 'vitest'
import { layerBands, layerThickness } from './layer-size.ts'

describe('layerThickness', () => {
  it('grows with what changed and stops at five', () => {
    expect(layerThickness({ words: 2 })).toBe(1)
    expect(layerThickness({ effects: 2 })).toBe(2)
    expect(layerThickness({ effects: 5 })).toBe(3)
    expect(layerThickness({ words: 5000, effects: 30 })).toBe(5)
  })

  it('gives an edition that changed nothing countable the thinnest layer', () => {
    expect(layerThickness({})).toBe(1)
  })
})

describe('layerBands', () => {
  it('shows every kind that changed, filling the layer', () => {
    const bands = layerBands({ words: 400, effects: 1, calculator: 1 })
    expect(bands.map((band) => band.kind)).toEqual(['calculator', 'words', 'effects'])
    expect(Math.min(...bands.map((band) => band.share))).toBeGreaterThan(5)
    expect(bands.reduce((sum, band) => sum + band.share, 0)).toBeGreaterThan(97)
  })
})
