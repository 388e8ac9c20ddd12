export { constraintBroken, postgresError }
export type { PostgresError }

interface PostgresError {
  /** SQLSTATE, such as `23505`. */
  code: string
  /** Name of the broken constraint or unique index, where there is one. */
  constraint: string
}

/** What PostgreSQL said, wherever in the chain of causes it stands (Drizzle wraps it); null for any other error. */
function postgresError(error: unknown): PostgresError | null {
  for (let e = error; typeof e === 'object' && e !== null; e = (e as { cause?: unknown }).cause) {
    const { code, constraint } = e as { code?: unknown; constraint?: unknown }
    if (typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code)) {
      return { code, constraint: typeof constraint === 'string' ? constraint : '' }
    }
  }
  return null
}

/** Whether a statement failed because of one of these constraints, so that a service can answer with a conflict. */
function constraintBroken(error: unknown, ...names: string[]): boolean {
  const found = postgresError(error)
  return found !== null && found.code.startsWith('23') && names.includes(found.constraint)
}
