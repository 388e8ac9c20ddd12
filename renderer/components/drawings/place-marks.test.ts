import { describe, expect, it } from 'vitest'
import { placeCallouts } from './place-callouts.ts'
import { MARK_SPACE, placeMarks } from './place-marks.ts'

const guide = (mark: string, adjustables: string[]) => ({ mark, title: mark, href: '#', adjustables })

describe('placeMarks', () => {
  it('keeps marks apart that share a place on the car', () => {
    const marks = placeMarks(
      placeCallouts([
        guide('E1', ['front_ride_height', 'rear_ride_height']),
        guide('E2', ['anti_squat']),
        guide('E3', ['front_droop', 'rear_droop']),
        guide('E4', ['front_sway_bar', 'rear_sway_bar']),
        guide('E5', ['rear_droop']),
      ]),
    )
    expect(marks).toHaveLength(8)
    for (const one of marks) {
      for (const other of marks) {
        if (one !== other) expect(Math.hypot(one.x - other.x, one.y - other.y)).toBeGreaterThan(MARK_SPACE * 0.85)
      }
    }
  })

  it('leaves a mark alone that has its place to itself', () => {
    expect(placeMarks(placeCallouts([guide('B1', ['centre_diff_fluid'])]))).toEqual([{ text: 'B1', x: 584, y: 150 }])
  })
})
