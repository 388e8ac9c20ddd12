import fc from 'fast-check'
import { expect, it } from 'vitest'
import { joinVersions } from './join-versions.ts'

it('takes each side’s own changes and disputes what both changed', () => {
  const base = { mass: 3.6, wheelbase: 325, tyreDiameter: 115, cgHeight: 45 }
  const mine = { mass: 3.5, wheelbase: 325, tyreDiameter: 114 }
  const theirs = { mass: 3.6, wheelbase: 322, tyreDiameter: 113, cgHeight: 45, trackFront: 255 }
  expect(joinVersions(base, mine, theirs)).toEqual({
    values: { mass: 3.5, wheelbase: 322, tyreDiameter: 114, trackFront: 255 },
    disputed: ['tyreDiameter'],
  })
})

it('is either side where the other changed nothing', () => {
  const some = fc.record({ mass: fc.integer(), wheelbase: fc.integer(), cgHeight: fc.integer() }, { requiredKeys: [] })
  fc.assert(
    fc.property(some, some, (base, other) => {
      expect(joinVersions(base, other, base)).toEqual({ values: other, disputed: [] })
      expect(joinVersions(base, base, other)).toEqual({ values: other, disputed: [] })
      expect(joinVersions(base, other, other).disputed).toEqual([])
    }),
  )
})
