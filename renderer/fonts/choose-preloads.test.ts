import { readdirSync, statSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { choosePreloads } from './choose-preloads.ts'

type Inject = false | 'HTML_BEGIN' | 'HTML_END'

const font = (file: string) => ({ assetType: 'font', src: `/assets/static/${file}.Ab1_x.woff2`, inject: 'HTML_BEGIN' as Inject })

describe('choosePreloads', () => {
  it('keeps the fonts of the first view and leaves other assets alone', () => {
    const style = { assetType: 'style', src: '/assets/static/reading.css', inject: 'HTML_BEGIN' as Inject }
    const assets = [...['camber-read-text', 'camber-read-sign-signs', 'camber-work', 'merriweather-latin-wght-normal'].map(font), style]
    choosePreloads(assets)
    expect(assets.map((asset) => asset.inject)).toEqual(['HTML_BEGIN', false, 'HTML_BEGIN', false, 'HTML_BEGIN'])
  })

  it.each(['/assets/static/renderer_styles_%-ae41ef73.D0.css', '/renderer/styles/%.css?direct'])('takes one beginning of two: %s', (address) => {
    const style = (name: string) => ({ assetType: 'style', src: address.replace('%', name), inject: 'HTML_BEGIN' as Inject })
    const chosen = (...names: string[]) => {
      const assets = names.map(style)
      choosePreloads(assets)
      return names.filter((_, at) => assets[at]!.inject)
    }
    expect(chosen('plain-pages', 'home', 'reading')).toEqual(['plain-pages', 'home'])
    expect(chosen('history', 'reading')).toEqual(['history', 'reading'])
  })

  it('knows every file it keeps, and those stay within 40 kB', () => {
    const files = readdirSync('renderer/fonts').filter((file) => file.endsWith('.woff2'))
    const assets = files.map((file) => font(file.replace('.woff2', '')))
    choosePreloads(assets)
    const kept = files.filter((_, at) => assets[at]!.inject)
    expect(kept).toHaveLength(4)
    expect(kept.reduce((sum, file) => sum + statSync(`renderer/fonts/${file}`).size, 0)).toBeLessThanOrEqual(40_000)
  })
})
