import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { makeAdmin } from '#server/people/make-admin.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { tokenIn } from './people-support.ts'

let app: TestApp
const id: Record<string, string> = {}
beforeAll(async () => {
  app = await createTestApp()
  const { rows } = await app.app.db.execute<{ key: string; id: string }>(sql`select key, id from members where key is not null`)
  for (const row of rows) id[row.key] = row.id
})
afterAll(() => app.stop())

const agentOf = (key: string | null) => (key === null ? Promise.resolve(app.agent()) : app.signedIn(key))

describe('looking after members', () => {
  it.each([
    [null, 401],
    ['priya', 403],
    ['imre', 403],
    ['wanda', 200],
  ])('as %s answers %i', async (key, status) => {
    const agent = await agentOf(key)
    await agent.get('/api/members').expect(status)
    await agent.put(`/api/members/${id.tomasz}/role`).send({ role: 'member' }).expect(status)
    await agent.put(`/api/members/${id.tomasz}/status`).send({ status: 'active' }).expect(status)
    await agent.delete(`/api/members/${id.tomasz}/sessions`).expect(status)
  })

  it.each([
    [{ role: 'owner' }, 422],
    [{}, 422],
    [{ role: 'admin', memberId: 'else' }, 200],
    [{ role: 'moderator', status: 'active' }, 422],
    [['moderator'], 422],
  ])('a role has to be one: %j answers %i', async (body, status) => {
    const wanda = await app.signedIn('wanda')
    await wanda.put(`/api/members/${id.odile}/role`).send(body).expect(status)
    await wanda.put(`/api/members/${id.odile}/role`).send({ role: 'moderator' }).expect(200)
  })

  it('a member that is none is not found, and an id that is none is refused', async () => {
    const wanda = await app.signedIn('wanda')
    await wanda.put('/api/members/00000000-0000-4000-8000-000000000000/role').send({ role: 'member' }).expect(404)
    await wanda.put("/api/members/1'--/role").send({ role: 'member' }).expect(422)
  })

  it('nobody gives out roles by joining or by the session', async () => {
    const priya = await app.signedIn('priya')
    await priya.put(`/api/members/${id.priya}/role`).send({ role: 'admin' }).expect(403)
    await priya.post(`/members/${id.priya}/role`).type('form').send({ role: 'admin' }).expect(403)
    await app.agent().post('/api/session').send({ ...DEMO_PASSWORDS.priya, role: 'admin' }).expect(422)
  })
})

describe('a member', () => {
  it('who is suspended is refused with the very next request, and at signing in', async () => {
    const tomasz = await app.signedIn('tomasz')
    const wanda = await app.signedIn('wanda')
    await wanda.post(`/members/${id.tomasz}/status`).type('form').send({ status: 'suspended' }).expect(303)
    await tomasz.get('/api/sessions').expect(401)
    const refused = await app.agent().post('/api/session').send(DEMO_PASSWORDS.tomasz).expect(403)
    expect(refused.body.code).toBe('suspended')
    await app.agent().post('/api/session').send({ ...DEMO_PASSWORDS.tomasz, password: 'not the one at all' }).expect(401)
    await wanda.put(`/api/members/${id.tomasz}/status`).send({ status: 'active' }).expect(200)
    await app.agent().post('/api/session').send(DEMO_PASSWORDS.tomasz).expect(200)
  })

  it('is met as what they are now, even while a session of before lives on', async () => {
    const imre = await app.signedIn('imre')
    await app.app.db.execute(sql`update members set role = 'member' where key = 'imre'`)
    expect((await imre.get('/api/session')).body.member).toMatchObject({ role: 'member' })
    await app.app.db.execute(sql`update members set status = 'suspended' where key = 'imre'`)
    expect((await imre.get('/api/session')).body.member).toBeNull()
    await app.app.db.execute(sql`update members set role = 'moderator', status = 'active' where key = 'imre'`)
    expect((await imre.get('/api/session')).body.member).toBeNull()
  })

  it('who gets another role signs in again', async () => {
    const odile = await app.signedIn('odile')
    const wanda = await app.signedIn('wanda')
    await wanda.post(`/members/${id.odile}/role`).type('form').send({ role: 'member' }).expect(303)
    expect((await odile.get('/api/session')).body.member).toBeNull()
    await wanda.put(`/api/members/${id.odile}/role`).send({ role: 'moderator' }).expect(200)
    const { rows } = await app.app.db.execute(sql`
      select details from audit_entries where action = 'member.change_role' and subject_id = ${id.odile} order by id desc limit 1`)
    expect(rows[0]?.details).toMatchObject({ before: { role: 'member' }, after: { role: 'moderator' } })
  })

  it('can be signed out everywhere by an admin', async () => {
    const priya = await app.signedIn('priya')
    const wanda = await app.signedIn('wanda')
    const { body } = await wanda.delete(`/api/members/${id.priya}/sessions`).expect(200)
    expect(body.ended).toBeGreaterThan(0)
    expect((await priya.get('/api/session')).body.member).toBeNull()
  })
})

describe('an admin', () => {
  it('who has not confirmed their address looks after nobody', async () => {
    const wanda = await app.signedIn('wanda')
    await app.app.db.execute(sql`update members set email_verified_at = null where key = 'wanda'`)
    await wanda.get('/api/members').expect(403)
    await wanda.put(`/api/members/${id.tomasz}/role`).send({ role: 'admin' }).expect(403)
    await wanda.put(`/api/members/${id.tomasz}/status`).send({ status: 'suspended' }).expect(403)
    const refused = await wanda.delete(`/api/members/${id.tomasz}/sessions`).expect(403)
    expect(refused.text).toContain('Confirm your e-mail address first')
    const priya = await app.signedIn('priya')
    await app.app.db.execute(sql`update members set email_verified_at = null where key = 'priya'`)
    expect((await priya.get('/api/members').expect(403)).text).toContain('for admins')
    await app.app.db.execute(sql`update members set email_verified_at = now() where key in ('wanda', 'priya')`)
    await wanda.get('/api/members').expect(200)
  })
})

describe('the last admin', () => {
  it('stays', async () => {
    const wanda = await app.signedIn('wanda')
    const refused = await wanda.put(`/api/members/${id.wanda}/role`).send({ role: 'member' }).expect(409)
    expect(refused.body.code).toBe('last_admin')
    await wanda.put(`/api/members/${id.wanda}/status`).send({ status: 'suspended' }).expect(409)
  })

  it('of two who step down at the same time one stays', async () => {
    await app.app.db.execute(sql`update members set role = 'admin' where key = 'odile'`)
    const [wanda, odile] = await Promise.all([app.signedIn('wanda'), app.signedIn('odile')])
    const answers = await Promise.all([
      wanda.put(`/api/members/${id.wanda}/role`).send({ role: 'member' }),
      odile.put(`/api/members/${id.odile}/role`).send({ role: 'member' }),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    const { rows } = await app.app.db.execute(sql`select 1 from members where role = 'admin' and status = 'active'`)
    expect(rows).toHaveLength(1)
    await app.app.db.execute(sql`update members set role = case key when 'wanda' then 'admin' else 'moderator' end where key in ('wanda', 'odile')`)
  })

  it('the first one is made from the command line and sets a password by the link', async () => {
    const email = 'first@marsh.example'
    const link = await makeAdmin(app.app, { name: 'First Admin', email })
    const token = new URL(link).searchParams.get('token')!
    expect(await tokenIn(app, email)).toBe(token)
    await app.agent().post('/api/password-resets/redeem').send({ token, password: 'lantern on the far side' }).expect(204)
    const answer = await app.agent().post('/api/session').send({ email, password: 'lantern on the far side' }).expect(200)
    expect(answer.body.member).toMatchObject({ name: 'First Admin', role: 'admin', verified: true })
    await expect(makeAdmin(app.app, { name: 'X', email })).rejects.toMatchObject({ status: 422 })
  })

  it('is whoever reads the mail, not whoever joined with the address before', async () => {
    const email = 'squatted@marsh.example'
    const password = 'i was here before anybody'
    const squatter = app.agent()
    await squatter.post('/api/members').send({ name: 'Early Bird', email, password }).expect(201)
    const older = await tokenIn(app, email)
    await squatter.post('/api/session').send({ email, password }).expect(200)
    const token = new URL(await makeAdmin(app.app, { name: 'Late Admin', email })).searchParams.get('token')!
    expect((await squatter.get('/api/session')).body.member).toBeNull()
    await squatter.post('/api/session').send({ email, password }).expect(401)
    await app.agent().post('/api/verifications').send({ token: older }).expect(422)
    const state = async () =>
      (await app.app.db.execute(sql`select role, email_verified_at is not null as verified from members where email = ${email}`)).rows[0]
    expect(await state()).toEqual({ role: 'admin', verified: false })
    await app.agent().post('/api/password-resets/redeem').send({ token, password: 'lantern on the far side' }).expect(204)
    expect(await state()).toEqual({ role: 'admin', verified: true })
  })
})
