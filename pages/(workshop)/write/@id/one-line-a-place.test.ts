import { expect, it } from 'vitest'
import { oneLineAPlace } from './one-line-a-place.ts'

it('puts what is open in one effect into one line, where its first field is, and leaves the rest', () => {
  const title = { field: 'title', message: 'Title: write at least 3 characters.' }
  const line = { line: 3, message: 'There is no such calculator.' }
  const list = oneLineAPlace([
    title,
    { field: 'effects.1.direction', message: 'Which way: choose one from the list.' },
    { field: 'effects.1.phase', message: 'Where on the lap: choose one from the list.' },
    { field: 'effects.10.note', message: 'Note: keep it under 201 characters.' },
    line,
  ])
  expect(list).toEqual([
    title,
    { field: 'effects.1.direction', message: 'Effect 2 is not finished: 2 fields are open.' },
    { field: 'effects.10.note', message: 'Effect 11. Note: keep it under 201 characters.' },
    line,
  ])
})
