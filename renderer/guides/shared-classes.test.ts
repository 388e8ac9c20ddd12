import { describe, expect, it } from 'vitest'
import type { LapEffect } from '#shared/effects/lap-rows.ts'
import { withoutSharedClasses } from './shared-classes.ts'

type Row = LapEffect & { adjustableName: string }
const effect = (given: Partial<Row>): Row => ({
  adjustable: 'front_diff_fluid', adjustableName: 'Front diff fluid', direction: 'up', phase: 'exit', quality: 'drive',
  change: 'more', strength: 2, surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '', ...given,
})

describe('withoutSharedClasses', () => {
  it('says once what every effect of an adjustable has in common, and joins adjustables that have the same', () => {
    const { effects, notes } = withoutSharedClasses([
      effect({ carClasses: ['truggy_8', 'buggy_8e'] }),
      effect({ carClasses: ['buggy_8e', 'truggy_8'], phase: 'entry' }),
      effect({ adjustable: 'centre_diff_fluid', adjustableName: 'Centre diff fluid', carClasses: ['buggy_8e', 'truggy_8'] }),
      effect({ adjustable: 'rear_diff_fluid', adjustableName: 'Rear diff fluid' }),
    ])
    expect(effects.flatMap(({ carClasses }) => carClasses)).toEqual([])
    expect(notes).toEqual([
      { adjustables: ['Front diff fluid', 'Centre diff fluid'], classes: '1/8 electric buggy, 1/8 truggy' },
    ])
  })

  it('leaves classes in place where they tell effects of one adjustable apart', () => {
    const given = [effect({ carClasses: ['truggy_8'] }), effect({ carClasses: [] })]
    expect(withoutSharedClasses(given)).toEqual({ effects: given, notes: [] })
  })
})
