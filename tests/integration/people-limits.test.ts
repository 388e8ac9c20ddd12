import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { GOOD_PASSWORD, behindProxy, from, tokenIn } from './people-support.ts'

let app: TestApp
let otherNode: TestApp
beforeAll(async () => {
  app = await createTestApp(behindProxy)
  otherNode = await createTestApp({ ...behindProxy, databaseUrl: app.databaseUrl })
})
afterAll(async () => {
  await otherNode.stop()
  await app.stop()
})
beforeEach(() => app.app.db.execute(sql`delete from rate_limits`))

const guess = (node: TestApp, email: string, network: number, password = 'not the one at all') =>
  node.agent().post('/api/session').set(from(network)).send({ email, password })

describe('wrong passwords', () => {
  it('are counted for the account over all nodes, and from that network the right one waits too, but not for ever', async () => {
    const { email, password } = DEMO_PASSWORDS.priya!
    const signedIn = await app.signedIn('priya')
    for (let i = 0; i < 5; i += 1) await guess(i % 2 === 0 ? app : otherNode, email, 60).expect(401)
    const refused = await guess(otherNode, email.toUpperCase(), 60).expect(429)
    expect(refused.headers['content-type']).toContain('application/problem+json')
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    expect(Number(refused.headers['retry-after'])).toBeLessThanOrEqual(900)
    await guess(app, email, 60, password).expect(429)
    // The member at home is not kept out by somebody else's guesses; nor is whoever is signed in, nor other accounts.
    await guess(app, email, 67, password).expect(200)
    expect((await signedIn.get('/api/session')).body.member).toMatchObject({ name: 'Priya Haldane' })
    await guess(app, DEMO_PASSWORDS.odile!.email, 67, DEMO_PASSWORDS.odile!.password).expect(200)
    await app.app.db.execute(sql`update rate_limits set expire = expire - 900000`)
    await guess(app, email, 60, password).expect(200)
  })

  it('are counted from all networks together too, fifty in a quarter of an hour', async () => {
    const { email, password } = DEMO_PASSWORDS.odile!
    for (let i = 0; i < 50; i += 1) await guess(i % 2 === 0 ? app : otherNode, email, 150 + (i % 10)).expect(401)
    await guess(app, email, 170).expect(429)
    await guess(otherNode, email, 171, password).expect(429)
  })

  it('are forgotten once the right one was given', async () => {
    const { email, password } = DEMO_PASSWORDS.tomasz!
    for (let round = 0; round < 3; round += 1) {
      for (let i = 0; i < 4; i += 1) await guess(app, email, 70 + round).expect(401)
      await guess(app, email, 70 + round, password).expect(200)
    }
  })

  it('are counted one by one when they come all at once', async () => {
    const { email, password } = DEMO_PASSWORDS.imre!
    const answers = await Promise.all([
      ...Array.from({ length: 12 }, (_, i) => guess(i % 2 === 0 ? app : otherNode, email, 80)),
    ])
    expect(answers.filter(({ status }) => status === 401)).toHaveLength(5)
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(7)
    await guess(app, email, 80, password).expect(429)
  })

  it('are counted for a network, whatever it says about others', async () => {
    for (let i = 0; i < 30; i += 1) await guess(i % 2 === 0 ? app : otherNode, `nobody-${i}@marsh.example`, 100).expect(401)
    await guess(app, 'nobody-30@marsh.example', 100).expect(429)
    await guess(app, 'nobody-31@marsh.example', 101).expect(401)
    const { email, password } = DEMO_PASSWORDS.wanda!
    await guess(app, email, 101, password).expect(200)
  })

  it('cannot be hidden behind a made-up address', async () => {
    const direct = await createTestApp({ databaseUrl: app.databaseUrl })
    try {
      for (let i = 0; i < 30; i += 1) await guess(direct, `nobody-${i}@marsh.example`, i).expect(401)
      await guess(direct, 'nobody-30@marsh.example', 200).expect(429)
    } finally {
      await direct.stop()
    }
  })

  it('stop no member who sets a new password by mail', async () => {
    const { email } = DEMO_PASSWORDS.priya!
    for (let i = 0; i < 6; i += 1) await guess(app, email, 117)
    await app.agent().post('/api/password-resets').set(from(117)).send({ email }).expect(202)
    // Either node may have sent it.
    const sentBy = (await Promise.all([app, otherNode].map(async (node) => ({ node, mails: await node.mailTo(email) }))))
      .find(({ mails }) => mails.length > 0)!.node
    const redeemed = { token: await tokenIn(sentBy, email), password: DEMO_PASSWORDS.priya!.password }
    await app.agent().post('/api/password-resets/redeem').set(from(117)).send(redeemed).expect(204)
    await guess(app, email, 117, DEMO_PASSWORDS.priya!.password).expect(200)
  })
})

describe('a network', () => {
  it('joins five times an hour; what was refused for its form does not count', async () => {
    const join = (node: TestApp, i: number, password = GOOD_PASSWORD) =>
      node.agent().post('/api/members').set(from(120)).send({ name: `Number ${i}`, email: `n${i}@marsh.example`, password })
    await join(app, 0, 'too short').expect(422)
    for (let i = 1; i <= 5; i += 1) await join(i % 2 === 0 ? app : otherNode, i).expect(201)
    await join(app, 6).expect(429)
  })

  it('tries twenty links an hour', async () => {
    const redeem = (i: number) =>
      app.agent().post(i % 2 === 0 ? '/api/verifications' : '/api/password-resets/redeem').set(from(130))
        .send(i % 2 === 0 ? { token: `guess-${i}` } : { token: `guess-${i}`, password: GOOD_PASSWORD })
    for (let i = 0; i < 20; i += 1) await redeem(i).expect(422)
    await redeem(20).expect(429)
  })
})

it('one address gets three mails an hour, known or not, whoever asks', async () => {
  for (const email of [DEMO_PASSWORDS.odile!.email, 'nobody-mail@marsh.example']) {
    for (let i = 0; i < 3; i += 1) {
      await (i % 2 === 0 ? app : otherNode).agent().post('/api/password-resets').set(from(140 + i)).send({ email }).expect(202)
    }
    await app.agent().post('/api/password-resets').set(from(149)).send({ email: email.toUpperCase() }).expect(429)
  }
})
