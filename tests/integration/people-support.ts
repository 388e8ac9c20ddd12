export { GOOD_PASSWORD, behindProxy, from, joinAndVerify, tokenIn }

import type supertest from 'supertest'
import { expect } from 'vitest'
import type { TestApp } from '../support/test-app.ts'

const GOOD_PASSWORD = 'the wind is from the marsh today'

/** A test server that believes X-Forwarded-For of this machine, so that tests can come from several networks. */
const behindProxy = { environment: { TRUST_PROXY: '127.0.0.1' } }

/** Headers of a request from the n-th network (addresses of RFC 5737, for documentation). */
function from(network: number): Record<string, string> {
  return { 'X-Forwarded-For': `203.0.113.${network}` }
}

/** The secret of the newest mail's one-time link to one address. */
async function tokenIn(app: TestApp, address: string): Promise<string> {
  const [newest] = await app.mailTo(address)
  const token = /\?token=([\w-]+)/.exec(newest?.text ?? '')?.[1]
  if (token === undefined) throw new Error(`No link in the newest mail to ${address}: ${newest?.subject}`)
  return token
}

/** Joins, confirms the address and signs in. */
async function joinAndVerify(
  app: TestApp,
  person: { name: string; email: string; password?: string },
  network = 1,
): Promise<ReturnType<typeof supertest.agent>> {
  const password = person.password ?? GOOD_PASSWORD
  const agent = app.agent()
  await agent.post('/api/members').set(from(network)).send({ ...person, password }).expect(201)
  await agent.post('/api/verifications').set(from(network)).send({ token: await tokenIn(app, person.email) }).expect(204)
  const signedIn = await agent.post('/api/session').set(from(network)).send({ email: person.email, password }).expect(200)
  expect(signedIn.body.member).toMatchObject({ name: person.name, role: 'member', verified: true })
  return agent
}
