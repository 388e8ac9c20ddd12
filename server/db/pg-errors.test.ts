import { describe, expect, it } from 'vitest'
import { constraintBroken, postgresError } from './pg-errors.ts'

const unique = Object.assign(new Error('duplicate key'), { code: '23505', constraint: 'editions_edit' })

describe('reading what PostgreSQL said', () => {
  it('finds it below the wrapping of the query builder', () => {
    const wrapped = new Error('Failed query', { cause: unique })
    expect(postgresError(wrapped)).toEqual({ code: '23505', constraint: 'editions_edit' })
    expect(constraintBroken(wrapped, 'editions_number', 'editions_edit')).toBe(true)
  })

  it('does not mistake other constraints or other errors for it', () => {
    expect(constraintBroken(unique, 'editions_number')).toBe(false)
    expect(constraintBroken(Object.assign(new Error(), { code: 'ECONNREFUSED' }), '')).toBe(false)
    expect(postgresError(undefined)).toBeNull()
  })
})
