import { JSDOM } from 'jsdom'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { rows } from './edits-support.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

type Agent = Awaited<ReturnType<TestApp['signedIn']>>
interface Report { id: string; verdict: string; note: string; setAside: { by: string; why: string } | null }

const TRIED = { adjustable: 'front_sway_bar', direction: 'down', verdict: 'helped', carClass: 'buggy_8e', surface: 'hard_packed', bite: 'high' }
const AT = '/report?change=front_sway_bar.down&class=buggy_8e&surface=hard_packed&bite=high'

let app: TestApp
let [priya, tomasz, odile, wanda]: Agent[] = []
beforeAll(async () => {
  app = await createTestApp()
  ;[priya, tomasz, odile, wanda] = await Promise.all(['priya', 'tomasz', 'odile', 'wanda'].map((who) => app.signedIn(who)))
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from heat_reports')
  await rows(app, 'delete from rate_limits')
})

async function report(who: Agent, more: object = {}, status = 201): Promise<Report> {
  return (await who.post('/api/heat-reports').send({ ...TRIED, ...more }).expect(status)).body as Report
}
const own = async (who: Agent) => (await who.get('/api/heat-reports?mine').expect(200)).body as Report[]
const tally = async () => (await rows(app, 'select coalesce(sum(helped), 0)::int helped, coalesce(sum(same), 0)::int same, coalesce(sum(worse), 0)::int worse from heat_report_tallies'))[0]

describe('a heat report', () => {
  it('is replaced by a second on the same change and condition, and stands beside one on another', async () => {
    const first = await report(priya!, { note: 'New pins' })
    const second = await report(priya!, { verdict: 'worse' }, 200)
    expect(second).toMatchObject({ id: first.id, verdict: 'worse', note: '' })
    await report(priya!, { surface: 'loose' })
    expect(await own(priya!)).toHaveLength(2)
    expect(await own(tomasz!)).toEqual([])
    expect(await tally()).toEqual({ helped: 1, same: 0, worse: 1 })
  })

  it('counts once when it is sent many times at once', async () => {
    await Promise.all(Array.from({ length: 6 }, () => priya!.post('/api/heat-reports').send(TRIED)))
    expect(await own(priya!)).toHaveLength(1)
    expect(await tally()).toEqual({ helped: 1, same: 0, worse: 0 })
  })

  it('is taken back by its writer and by nobody else', async () => {
    const { id } = await report(priya!)
    await tomasz!.delete(`/api/heat-reports/${id}`).expect(404)
    await priya!.delete(`/api/heat-reports/${id}`).expect(204)
    await priya!.delete(`/api/heat-reports/${id}`).expect(404)
    expect(await tally()).toEqual({ helped: 0, same: 0, worse: 0 })
  })

  it('does not count while its member is suspended, who cannot report either', async () => {
    const imre = await app.signedIn('imre')
    await report(imre)
    await rows(app, `update members set status = 'suspended' where key = 'imre'`)
    expect(await tally()).toEqual({ helped: 0, same: 0, worse: 0 })
    await report(imre, { surface: 'loam' }, 401)
    await rows(app, `update members set status = 'active' where key = 'imre'`)
    expect(await tally()).toEqual({ helped: 1, same: 0, worse: 0 })
  })

  it('can be sent thirty times within an hour', async () => {
    const { length } = await Promise.all(Array.from({ length: 30 }, () => priya!.post('/api/heat-reports').send(TRIED)))
    expect(length).toBe(30)
    const refused = await priya!.post('/api/heat-reports').send(TRIED).expect(429)
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    await report(tomasz!)
  })

  it.each([
    [{ adjustable: 'flux_capacitor' }, 'adjustable'],
    [{ adjustable: 'a\u0000' }, 'adjustable'],
    [{ adjustable: 7 }, 'adjustable'],
    [{ direction: 'sideways' }, 'direction'],
    [{ verdict: 'better' }, 'verdict'],
    [{ carClass: '' }, 'carClass'],
    [{ surface: 'moon' }, 'surface'],
    [{ bite: null }, 'bite'],
    [{ note: 'x'.repeat(301) }, 'note'],
    [{ note: 'one\nanother' }, 'note'],
    [{ note: 'nothing\u0000' }, 'note'],
    [{ memberId: 'someone' }, 'memberId'],
  ])('is refused with words at the field: %j', async (wrong, field) => {
    const { errors } = (await priya!.post('/api/heat-reports').send({ ...TRIED, ...wrong }).expect(422)).body as { errors: { field: string }[] }
    expect(errors.map((each) => each.field)).toEqual([field])
  })
})

describe('set aside', () => {
  it('does not count, says why to its writer, goes into the record, and cannot be got round', async () => {
    const { id } = await report(priya!)
    await odile!.post(`/api/heat-reports/${id}/set-aside`).send({ reason: '' }).expect(422)
    await odile!.post(`/api/heat-reports/${id}/set-aside`).send({ reason: 'The car had a bent arm' }).expect(200)
    expect(await tally()).toEqual({ helped: 0, same: 0, worse: 0 })
    expect((await own(priya!))[0]!.setAside).toMatchObject({ why: 'The car had a bent arm' })
    await report(priya!, { verdict: 'same' }, 409)
    await priya!.delete(`/api/heat-reports/${id}`).expect(409)
    expect(await rows(app, `select action, details->>'reason' reason from audit_entries where subject_kind = 'heat_report'`)).toEqual([
      { action: 'heat_report.set_aside', reason: 'The car had a bent arm' },
    ])
    await odile!.delete(`/api/heat-reports/${id}/set-aside`).expect(200)
    expect(await tally()).toEqual({ helped: 1, same: 0, worse: 0 })
  })

  it('is decided by nobody about their own', async () => {
    const { id } = await report(odile!)
    await odile!.post(`/api/heat-reports/${id}/set-aside`).send({ reason: 'Changed my mind' }).expect(403)
    await wanda!.post(`/api/heat-reports/${id}/set-aside`).send({ reason: 'Another decides' }).expect(200)
  })
})

describe('the pages', () => {
  const page = async (who: Agent, path: string) => new JSDOM((await who.get(path).expect(200)).text).window.document

  it('lead a visitor to sign in and back', async () => {
    const answer = await app.agent().get(AT).redirects(0)
    expect(answer.headers.location).toBe(`/sign-in?next=${encodeURIComponent(AT)}`)
    const posted = await app.agent().post('/report').type('form').send({ change: 'caster.up', class: 'buggy_8e', verdict: 'same' }).redirects(0)
    expect(posted.headers.location).toBe(`/sign-in?next=${encodeURIComponent('/report?change=caster.up&class=buggy_8e')}`)
  })

  it('save by form, thank with the new counts, and lead back only within the book', async () => {
    const form = { change: 'front_sway_bar.down', class: 'buggy_8e', surface: 'hard_packed', bite: 'high', verdict: 'helped', note: '' }
    const back = '/feel?complaint=entry.steering.more'
    const saved = await priya!.post('/report').type('form').send({ ...form, back }).redirects(0).expect(303)
    const thanks = await page(priya!, saved.headers.location as string)
    expect(thanks.querySelector('main')!.textContent).toContain('1 of 1 agree')
    expect(thanks.querySelector(`main a[href="${back}"]`)).not.toBeNull()
    const away = await priya!.post('/report').type('form').send({ ...form, back: '//evil.example/' }).redirects(0).expect(303)
    expect(away.headers.location).not.toContain('evil')
  })

  it('show a refused form again with what was typed', async () => {
    const answer = await priya!.post('/report').type('form').send({ change: 'front_sway_bar.down', class: 'buggy_8e', note: 'Dry', verdict: 'helped' }).expect(422)
    const { document } = new JSDOM(answer.text).window
    expect(document.querySelector('#errors')!.textContent).toContain('Ground')
    expect(document.querySelector<HTMLInputElement>('#note')!.value).toBe('Dry')
    expect(document.querySelector<HTMLSelectElement>('#class')!.value).toBe('buggy_8e')
  })

  it('ask which change where the address names none that there is', async () => {
    for (const path of ['/report', '/report?change=flux_capacitor.up', '/report?change=%3Cscript%3E&class=moon']) {
      expect((await page(priya!, path)).querySelector('select[name="change"]')).not.toBeNull()
    }
  })

  it('show a hostile note as text and nothing else', async () => {
    const note = '<img src=x onerror=alert(1)></p><script>alert(2)</script>\u202Egnp'
    await report(priya!, { note })
    for (const [who, path] of [[priya!, '/you'], [odile!, '/reports'], [priya!, AT]] as const) {
      const shown = await page(who, path)
      expect(shown.querySelector('main img, main script')).toBeNull()
      expect(`${shown.querySelector('main')!.textContent}${shown.querySelector<HTMLInputElement>('#note')?.value ?? ''}`).toContain('onerror=alert(1)')
    }
  })

  it('list one’s own, and let them be taken back', async () => {
    const { id } = await report(priya!)
    expect((await page(priya!, '/you')).querySelector('#reports')!.textContent).toContain('Helped')
    await priya!.post(`/you/reports/${id}/take-back`).redirects(0).expect(303)
    expect(await own(priya!)).toEqual([])
  })

  it('show moderators a sudden one-sided burst, and none where the club disagrees', async () => {
    const many = (adjustable: string, verdict: string) =>
      rows(app, `insert into heat_reports (member_id, adjustable, direction, verdict, car_class, surface, bite)
        select id, '${adjustable}', 'up', '${verdict}', 'buggy_8e', 'loam', 'low' from (select id from members order by key limit 5) few`)
    await many('caster', 'worse')
    await many('kick_up', 'worse')
    await rows(app, `update heat_reports set verdict = 'helped' where adjustable = 'kick_up' and id in (select id from heat_reports where adjustable = 'kick_up' limit 2)`)
    const bursts = (await page(odile!, '/reports')).querySelector('section[aria-labelledby="bursts"]')!.textContent
    expect(bursts).toContain('Caster')
    expect(bursts).not.toContain('Kick')
    expect((await page(odile!, '/review')).querySelector('a[href="/reports"]')).not.toBeNull()
  })

  it('say truly whether there are any reports, also from memory', async () => {
    const sure = async () => (await app.agent().get('/about/sure').expect(200)).text.includes('no heat reports yet')
    await rows(app, `select pg_notify('published', 'test')`)
    await expect.poll(sure).toBe(true)
    const { id } = await report(priya!)
    await expect.poll(sure).toBe(false)
    await priya!.delete(`/api/heat-reports/${id}`).expect(204)
    await expect.poll(sure).toBe(true)
  })
})
