import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { articleData, jsonForScript } from './json-ld.ts'

describe('jsonForScript', () => {
  it('cannot leave the script element, whatever a title says', () => {
    const hostile = '</script><!--<script>alert(1)</script>\u2028\u2029&'
    const json = jsonForScript({ headline: hostile })
    expect(json).not.toMatch(/[<>&\u2028\u2029]/)
    expect(JSON.parse(json)).toEqual({ headline: hostile })
  })

  it('reads back as what was put in', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        const json = jsonForScript(value)
        expect(json).not.toContain('<')
        expect(JSON.parse(json)).toEqual(JSON.parse(JSON.stringify(value)))
      }),
    )
  })
})

describe('articleData', () => {
  it('names writers, moderator, dates and address', () => {
    const article = articleData(
      {
        slug: 'droop', mark: 'E2', title: 'Droop', inShort: 'How far a wheel drops.', chapter: { name: 'How the car sits and moves' },
        edition: 3, contributors: [{ name: 'Imre Vass' }, { name: 'Priya Haldane' }], approver: { name: 'Odile Marchetti' },
        firstPublishedAt: '2026-01-02T10:00:00.000Z', publishedAt: '2026-03-02T10:00:00.000Z',
      },
      { origin: 'https://book.example', club: 'Saltmarsh Flats R/C' },
    )
    expect(article).toMatchObject({
      '@type': 'Article', headline: 'Droop', mainEntityOfPage: 'https://book.example/guides/droop',
      author: [{ name: 'Imre Vass' }, { name: 'Priya Haldane' }], editor: { name: 'Odile Marchetti' },
      datePublished: '2026-01-02T10:00:00.000Z', dateModified: '2026-03-02T10:00:00.000Z',
    })
  })
})
