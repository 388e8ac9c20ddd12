export { createAccountCar, deleteAccountCar, chooseAccountCar, listAccountCars, saveAccountCar }
export type { AccountAnswer }

import type { Car } from '#shared/cars/car.ts'
import type { CarView } from '#shared/schemas/car.ts'

type AccountAnswer =
  | { kind: 'saved'; car: CarView }
  | { kind: 'stale' }
  | { kind: 'gone' }
  | { kind: 'refused'; message: string }
  | { kind: 'signed_out' }
  | { kind: 'away'; retryAfterSeconds: number }

async function createAccountCar(car: Car, leaving = false): Promise<AccountAnswer> {
  return ask('POST', '/api/cars', { body: car, keepalive: leaving })
}

/** Saves over the version that was last seen. */
async function saveAccountCar({ id, ...fields }: Car, version: number, leaving = false): Promise<AccountAnswer> {
  return ask('PUT', `/api/cars/${id}`, { body: fields, version, keepalive: leaving })
}

async function chooseAccountCar(id: string): Promise<AccountAnswer> {
  return ask('POST', `/api/cars/${id}/choose`, { body: {} })
}

/** @returns what went wrong; null when it is deleted */
async function deleteAccountCar(id: string, version: number): Promise<Exclude<AccountAnswer, { kind: 'saved' }> | null> {
  const answer = await ask('DELETE', `/api/cars/${id}`, { version })
  return answer.kind === 'saved' || answer.kind === 'gone' ? null : answer
}

/** The account's cars; null when it cannot be reached. */
async function listAccountCars(): Promise<CarView[] | null> {
  try {
    const response = await fetch('/api/cars', { cache: 'no-store' })
    return response.ok ? ((await response.json()) as CarView[]) : null
  } catch {
    return null
  }
}

async function ask(
  method: string,
  url: string,
  { body, version, keepalive = false }: { body?: object; version?: number; keepalive?: boolean },
): Promise<AccountAnswer> {
  try {
    const response = await fetch(url, {
      method,
      headers: {
        ...(body && { 'Content-Type': 'application/json' }),
        ...(version !== undefined && { 'If-Match': `"${version}"` }),
      },
      ...(body && { body: JSON.stringify(body) }),
      keepalive,
    })
    if (response.ok) return { kind: 'saved', car: (response.status === 204 ? null : await response.json()) as CarView }
    if (response.status === 412) return { kind: 'stale' }
    if (response.status === 404) return { kind: 'gone' }
    if (response.status === 401) return { kind: 'signed_out' }
    if (response.status === 429 || response.status >= 500) {
      return { kind: 'away', retryAfterSeconds: Number(response.headers.get('Retry-After')) || 0 }
    }
    const { code, title, errors } = (await response.json()) as { code?: string; title?: string; errors?: { message: string }[] }
    // The account took it in before, and its answer was lost: what it holds now decides how to go on.
    if (code === 'car_exists') return { kind: 'stale' }
    return { kind: 'refused', message: errors?.[0]?.message ?? title ?? 'Your account does not take this car as it is.' }
  } catch {
    return { kind: 'away', retryAfterSeconds: 0 }
  }
}
