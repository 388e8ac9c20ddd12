import { describe, expect, it } from 'vitest'
import type { AdjustableView, LapEffect } from '#server/effects/index.ts'
import { groupByWish } from './group-by-wish.ts'

const adjustable = (key: string, minutes: number): AdjustableView => ({
  key, name: key, axle: 'rear', unit: 'mm', up: 'up', down: 'down', smallStep: 1, minutes, tools: [], opensCar: false, guide: null, about: '',
})
const adjustables = [adjustable('rear_droop', 5), adjustable('rear_toe', 15)]
const effect = (given: Partial<LapEffect> = {}): LapEffect => ({
  adjustable: 'rear_droop', adjustableName: 'rear_droop', way: 'up', direction: 'up', phase: 'exit', quality: 'rear_grip',
  change: 'more', strength: 2, surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
  guide: { slug: 'droop', mark: 'E3', title: 'Droop' }, ...given,
})
const shown = (effects: LapEffect[]) =>
  groupByWish(effects, adjustables).map(({ anchor, rows }) => [anchor, rows.map((row) => `${row.adjustable.key} ${row.way}`)])

describe('groupByWish', () => {
  it('lists an effect that mirrors under both wishes, the other way round for the other one', () => {
    expect(shown([effect()])).toEqual([
      ['rear_grip-more', ['rear_droop up']],
      ['rear_grip-less', ['rear_droop down']],
    ])
  })

  it('says nothing about the other way when the effect does not mirror, or when the other way has its own', () => {
    expect(shown([effect({ mirrors: false })])).toEqual([['rear_grip-more', ['rear_droop up']]])
    expect(shown([effect(), effect({ direction: 'down', change: 'more', strength: 1 })])).toEqual([
      ['rear_grip-more', ['rear_droop up', 'rear_droop down']],
    ])
  })

  it('puts the strongest first, then the quickest', () => {
    const rows = shown([
      effect({ adjustable: 'rear_toe', mirrors: false }),
      effect({ strength: 1, mirrors: false }),
      effect({ strength: 2, mirrors: false }),
    ])
    expect(rows[0]?.[1]).toEqual(['rear_droop up', 'rear_toe up', 'rear_droop up'])
  })

  it('says that a change is disputed when guides say both', () => {
    const wishes = groupByWish([effect({ bites: ['high'] }), effect({ bites: ['low'], change: 'less' })], adjustables)
    expect(wishes.flatMap(({ rows }) => rows).every(({ disputed }) => disputed)).toBe(true)
  })

  it('puts what drivers usually want before its opposite, quality after quality', () => {
    const anchors = groupByWish([effect(), effect({ quality: 'steering' })], adjustables).map(({ anchor }) => anchor)
    expect(anchors).toEqual(['steering-more', 'rear_grip-more', 'steering-less', 'rear_grip-less'])
  })

  it('leaves out an effect on something nobody knows any more', () => {
    expect(groupByWish([effect({ adjustable: 'gone' })], adjustables)).toEqual([])
  })
})
