import { JSDOM } from 'jsdom'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { rows } from './edits-support.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())
beforeEach(() => rows(app, 'delete from heat_reports'))

const ask = async (query: string, status = 200) => (await app.agent().get(`/api/by-feel?${query}`).expect(status)).body

async function report(member: string, change: string, verdict: string, [carClass, surface, bite] = ['buggy_8e', 'hard_packed', 'high']) {
  const [adjustable, direction] = change.split(' ')
  await rows(
    app,
    `insert into heat_reports (member_id, adjustable, direction, verdict, car_class, surface, bite)
     select id, '${adjustable}', '${direction}', '${verdict}', '${carClass}', '${surface}', '${bite}' from members where key = '${member}'`,
  )
}
const tally = async (change: string) => {
  const [adjustable, direction] = change.split(' ')
  const [found] = await rows(app, `select sum(helped)::int helped, sum(same)::int same, sum(worse)::int worse from heat_report_tallies where adjustable = '${adjustable}' and direction = '${direction}'`)
  return found
}

interface EffectRow {
  adjustable: string; direction: string; phase: string; quality: string; change: string; strength: number
  surfaces: string[]; bites: string[]; car_classes: string[]; mirrors: boolean; basis: string
}
interface Told { adjustable: string; direction: string; score: number; help: number; cost: number; minutes: number }

const usually: Record<string, string> = { roll: 'neither', nose_up: 'neither', motor_heat: 'less' }

/** The score as effects.md states it, worked out row by row from the tables and from nothing of the product's. */
async function scoresByHand(complaints: [string, string, string][], reader: { surface: string; bite: string; carClass: string }) {
  const effects = (await rows(app, 'select * from effects')) as unknown as EffectRow[]
  const reports = await rows(app, 'select * from heat_reports where set_aside_by is null')
  const minutes = new Map((await rows(app, 'select key, minutes from adjustables')).map((row) => [row['key'], row['minutes']]))
  const fit = (named: string[], own: string) => (named.length === 0 ? 0.8 : named.includes(own) ? 1 : 0)
  const fits = (each: EffectRow) => fit(each.surfaces, reader.surface) * fit(each.bites, reader.bite) * fit(each.car_classes, reader.carClass)
  const fitting = effects.filter((each) => fits(each) > 0)
  const flip: Record<string, string> = { up: 'down', down: 'up', more: 'less', less: 'more' }
  const counted = fitting.flatMap((each) => {
    const other = flip[each.direction]!
    const own = fitting.some((one) => one.adjustable === each.adjustable && one.direction === other && one.phase === each.phase && one.quality === each.quality)
    return [each, ...(each.mirrors && !own ? [{ ...each, direction: other, change: flip[each.change]! }] : [])]
  })
  const scores: Told[] = []
  for (const key of new Set(counted.map(({ adjustable, direction }) => `${adjustable} ${direction}`))) {
    const [adjustable = '', direction = ''] = key.split(' ')
    const own = reports.filter((each) =>
      each['adjustable'] === adjustable && each['direction'] === direction && each['surface'] === reader.surface && each['bite'] === reader.bite && each['car_class'] === reader.carClass)
    const n = own.length
    const good = own.reduce((sum, { verdict }) => sum + (verdict === 'helped' ? 1 : verdict === 'same' ? 0.5 : 0), 0)
    const p = n === 0 ? 0 : good / n
    const z2 = 1.96 * 1.96
    const wilson = n === 0 ? 0 : (p + z2 / (2 * n) - 1.96 * Math.sqrt((p * (1 - p) + z2 / (4 * n)) / n)) / (1 + z2 / n)
    let help = 0
    let cost = 0
    for (const each of counted.filter((one) => one.adjustable === adjustable && one.direction === direction)) {
      const prior = { physics: 0.7, common_practice: 0.6, reported: 0.4 }[each.basis]!
      const value = each.strength * fits(each) * ((n * wilson + 10 * prior) / (n + 10))
      const complaint = complaints.find(([phase, quality]) => phase === each.phase && quality === each.quality)
      const wanted = usually[each.quality] ?? 'more'
      if (complaint) help += complaint[2] === each.change ? value : -value
      else if (wanted !== 'neither' && wanted !== each.change) cost += value
    }
    if (help > 0 && !(n > 0 && own.every(({ verdict }) => verdict === 'worse'))) {
      scores.push({ adjustable, direction, help, cost, score: help - 0.35 * cost, minutes: Number(minutes.get(adjustable)) })
    }
  }
  return scores.sort((a, b) => Math.round((b.score - a.score) * 1e9) || a.minutes - b.minutes || a.adjustable.localeCompare(b.adjustable))
}

describe('GET /api/by-feel', () => {
  it.each([
    ['entry.steering.more', 'hard_packed', 'high', 'buggy_8e'],
    ['middle.rear_grip.more&complaint=exit.drive.more', 'loose', 'low', 'truggy_8'],
    ['bumps.absorption.more&complaint=jumps.landing.more&complaint=entry.stability.more', 'artificial_turf', 'medium', 'buggy_10_4wd'],
  ])('ranks %s on %s with %s bite as the formula says', async (complaint, surface, bite, carClass) => {
    for (const [member, verdict] of [['priya', 'helped'], ['tomasz', 'same'], ['odile', 'worse']] as const) {
      await report(member, 'front_sway_bar down', verdict, [carClass, surface, bite])
      await report(member, 'rear_droop up', 'helped', [carClass, surface, bite])
    }
    const { changes } = (await ask(`complaint=${complaint}&surface=${surface}&bite=${bite}&class=${carClass}`)) as { changes: Told[] }
    const byHand = await scoresByHand(complaint.split('&complaint=').map((text) => text.split('.') as [string, string, string]), { surface, bite, carClass })
    expect(changes.length).toBeGreaterThan(2)
    expect(changes.map(({ adjustable, direction }) => `${adjustable} ${direction}`)).toEqual(
      byHand.slice(0, 20).map(({ adjustable, direction }) => `${adjustable} ${direction}`),
    )
    changes.forEach((change, at) => {
      for (const part of ['score', 'help', 'cost'] as const) expect(change[part]).toBeCloseTo(byHand[at]![part], 9)
    })
  })

  it('never recommends a change that everybody who tried it found worse', async () => {
    const best = ((await ask('complaint=entry.steering.more')) as { changes: Told[] }).changes[0]!
    await report('priya', `${best.adjustable} ${best.direction}`, 'worse')
    const { changes } = (await ask('complaint=entry.steering.more')) as { changes: Told[] }
    expect(changes.find(({ adjustable, direction }) => adjustable === best.adjustable && direction === best.direction)).toBeUndefined()
  })

  it.each([
    ['', 'complaint'],
    ['complaint=entry.steering.most', 'complaint'],
    ['complaint=entry.steering.more&complaint=entry.steering.less', 'complaint'],
    ['complaint=entry.steering.more&complaint=exit.drive.more&complaint=middle.roll.less&complaint=jumps.landing.more', 'complaint'],
    ['complaint=entry.steering.more&surface=moon', 'surface'],
    ['complaint=entry.steering.more&minutes=-1', 'minutes'],
    ['complaint=entry.steering.more&mood=bad', 'mood'],
    ['complaint[a]=entry.steering.more', 'complaint[a]'],
  ])('refuses “%s” with words at %s', async (query, field) => {
    const problem = (await ask(query, 422)) as { errors: { field: string; message: string }[] }
    expect(problem.errors.map((error) => error.field)).toContain(field)
  })
})

describe('the tallies of heat reports', () => {
  it('follow reports that come, change and go, that are set aside, and members who are suspended', async () => {
    const change = 'rear_toe up'
    await report('priya', change, 'helped')
    await report('tomasz', change, 'worse')
    expect(await tally(change)).toEqual({ helped: 1, same: 0, worse: 1 })
    await rows(app, `update heat_reports set verdict = 'same' where verdict = 'worse'`)
    expect(await tally(change)).toEqual({ helped: 1, same: 1, worse: 0 })
    await rows(app, `update members set status = 'suspended' where key = 'priya'`)
    expect(await tally(change)).toEqual({ helped: 0, same: 1, worse: 0 })
    await rows(app, `update heat_reports set verdict = 'worse' where verdict = 'helped'`)
    await rows(app, `update members set status = 'active' where key = 'priya'`)
    expect(await tally(change)).toEqual({ helped: 0, same: 1, worse: 1 })
    await rows(app, `update heat_reports set set_aside_by = member_id, set_aside_why = 'copied' where verdict = 'worse'`)
    expect(await tally(change)).toEqual({ helped: 0, same: 1, worse: 0 })
    await rows(app, 'delete from heat_reports')
    expect(await tally(change)).toEqual({ helped: 0, same: 0, worse: 0 })
  })
})

describe('the page by feel', () => {
  const read = async (path: string) => new JSDOM((await app.agent().get(path).expect(200)).text).window.document

  it('asks, without a script, and points at every part of the lap', async () => {
    const document = await read('/feel')
    expect(document.querySelector('form[method=get][action="/feel"] button')).not.toBeNull()
    expect(document.querySelectorAll('.board h2')).toHaveLength(PHASES.length)
    expect(document.querySelector('.try')).toBeNull()
  })

  it('answers in order, with what to look at first and what takes too long below a rule', async () => {
    const document = await read('/feel?complaint=entry.steering.more&surface=hard_packed&minutes=20')
    const { changes } = (await ask('complaint=entry.steering.more&surface=hard_packed')) as { changes: (Told & { name: string })[] }
    const listed = [...document.querySelectorAll('.try h3')].map((head) => head.textContent)
    expect(listed).toHaveLength(changes.length)
    expect(listed[0]).toContain(changes.find(({ minutes }) => minutes <= 20)!.name)
    expect(document.querySelectorAll('.look li').length).toBeGreaterThanOrEqual(2)
    expect(document.querySelector('.too-long')?.textContent).toContain('20 minutes')
    expect(document.title).toContain('Pushes at corner entry')
  })

  it('answers an old link as far as it can and says what it no longer knows', async () => {
    const document = await read('/feel?complaint=entry.steering.more&complaint=entry.sparkle.more&surface=moon')
    expect(document.querySelectorAll('.try').length).toBeGreaterThan(0)
    expect(document.body.textContent).toContain('“moon” is not a surface that we know')
    expect(document.body.textContent).toContain('“entry.sparkle.more” is not a complaint')
  })

  it('says what to do when no guide has an answer', async () => {
    const document = await read('/feel?complaint=jumps.run_time.more&surface=carpet')
    expect(document.querySelectorAll('.try')).toHaveLength(0)
    expect(document.body.textContent).toContain('No guide has a change for this yet')
    expect(document.querySelector('a[href="/feel?complaint=jumps.run_time.more"]')).not.toBeNull()
  })
})
