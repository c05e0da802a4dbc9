import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam, type TestTeam } from './support/agent.ts'
import { boxText, pushOf } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
beforeAll(async () => {
  server = await startTestServer()
})
afterAll(() => server.stop())

const day = 86_400_000

async function push(team: TestTeam, lid: number, branch: string): Promise<number> {
  const text = boxText({ lid: `${String(lid)} x 135 mm` })
  const body = pushOf({ sets: [{ file: 'a.yaml', text }], branch })
  const stored = await team.author.call(endpoints.push, { params: { team: team.slug }, body })
  await server.work()
  return stored.sets[0]?.number ?? 0
}
const numbers = async (team: TestTeam): Promise<readonly number[]> => {
  const params = { team: team.slug, set: 'boxed-notes' }
  return (await team.owner.call(endpoints.versions, { params })).items
    .map(({ number }) => number)
    .toSorted((a, b) => a - b)
}
const upkeep = async (): Promise<void> => {
  await server.context.database.transaction((manager) =>
    server.context.jobs.add(manager, 'upkeep', {}, { teamId: null, about: 'upkeep' }),
  )
  await server.work()
}

describe('retention', () => {
  it('removes old versions of branches by age and count, never what is published, reviewed, pinned or a baseline', async () => {
    const team = await createTeam(server, 'keepers')
    const params = { team: team.slug, set: 'boxed-notes' }
    await push(team, 177, 'main')
    for (const lid of [178, 179, 180, 181, 182]) await push(team, lid, 'try')
    const { content } = await team.reviewer.call(endpoints.version, { params: { ...params, number: 3 } })
    await team.reviewer.call(endpoints.decide, {
      params: { ...params, number: 3 },
      body: { decision: 'approve', content },
    })
    await team.author.call(endpoints.pinBaseline, { params, body: { number: 4, note: 'A good one.' } })
    const body = { mainDays: null, branchDays: null, branchVersions: 1 }
    const dry = await team.owner.call(endpoints.changeRetention, {
      params: { team: team.slug },
      query: { dryRun: 'true' },
      body,
    })
    expect(dry.wouldRemove).toBe(2)
    expect(await numbers(team)).toEqual([1, 2, 3, 4, 5, 6])
    await team.owner.call(endpoints.changeRetention, { params: { team: team.slug }, body })
    await upkeep()
    expect(await numbers(team)).toEqual([1, 3, 4, 6])
    await team.owner.call(endpoints.changeRetention, {
      params: { team: team.slug },
      body: { mainDays: 30, branchDays: 10, branchVersions: null },
    })
    server.later(40 * day)
    await upkeep()
    server.later(-40 * day)
    expect(await numbers(team)).toEqual([1, 3, 4])
    const gone = await team.owner.refusal(endpoints.compare, { params: { ...params, number: 1 }, query: { with: 6 } })
    expect([gone.status, gone.message]).toEqual([
      404,
      'boxed-notes has no version 6; it may have been removed by retention.',
    ])
    const texts: { n: string }[] = await server.context.database.query(
      `select count(*) as n from source_text where team_id = $1`,
      [team.id],
    )
    expect(Number(texts[0]?.n)).toBe(4)
  })
})

describe('a team', () => {
  it('can be exported whole, without secrets, and deleted with everything but its record', async () => {
    const team = await createTeam(server, 'goers')
    await push(team, 177, 'main')
    const { secret } = await team.owner.call(endpoints.createToken, {
      params: { team: 'goers' },
      body: { name: 'ci', scopes: ['read'] },
    })
    const answer = await fetch(`${server.url}/api/teams/goers/export`, { headers: { cookie: team.owner.cookie() } })
    const text = await answer.text()
    const whole = JSON.parse(text) as Record<string, readonly Record<string, unknown>[]>
    expect(whole['versions']).toHaveLength(1)
    expect(whole['members']).toHaveLength(5)
    expect(whole['texts']?.map((row) => row['text'])).toContain(boxText({ lid: '177 x 135 mm' }))
    expect(text).not.toContain(secret.slice(15))
    expect(text).not.toContain('argon2')
    const params = { team: 'goers' }
    expect((await team.owner.refusal(endpoints.deleteTeam, { params, body: { confirm: 'other' } })).status).toBe(422)
    await team.owner.call(endpoints.deleteTeam, { params, body: { confirm: 'goers' } })
    expect((await team.owner.refusal(endpoints.team, { params })).status).toBe(404)
    const left: { table: string; n: number }[] = await server.context.database.query(
      `select 'version' as table, count(*)::int as n from version where team_id = $1
       union all select 'text', count(*)::int from source_text where team_id = $1
       union all select 'audit', count(*)::int from audit_entry where team_id = $1 and verb = 'deleted'`,
      [team.id],
    )
    expect(Object.fromEntries(left.map(({ table, n }) => [table, n]))).toEqual({ version: 0, text: 0, audit: 1 })
  })

  it('sees work that failed for good, and can have it tried again', async () => {
    const team = await createTeam(server, 'menders')
    const { database, jobs } = server.context
    await database.transaction((manager) =>
      jobs.add(manager, 'send-mail', { to: 'nobody', subject: 'x', text: 'x' }, { teamId: team.id, about: 'mail “x”' }),
    )
    const id: { id: string }[] = await database.query(
      `select id from pgboss.job where name = 'send-mail' and data ->> 'teamId' = $1`,
      [team.id],
    )
    await database.query(`update pgboss.job set retry_limit = 0 where id = $1`, [id[0]?.id])
    await server.work()
    const params = { team: 'menders' }
    const { items } = await team.owner.call(endpoints.deadJobs, { params })
    expect(items).toMatchObject([{ kind: 'send-mail', about: 'mail “x”' }])
    await team.owner.call(endpoints.retryJob, { params: { ...params, job: items[0]?.id ?? '' } })
    expect((await team.owner.call(endpoints.deadJobs, { params })).items).toEqual([])
  })
})

describe('the list of sets', () => {
  it('filters by words, family, tag, branch and state, and finds what holds a card', async () => {
    const team = await createTeam(server, 'finders')
    const params = { team: 'finders' }
    const box = (name: string, family: string) =>
      boxText({ name, title: `Title of ${name} at 100%_` }).replace('sheet: a3', `family: ${family}\nsheet: a3`)
    const sets = [
      { file: 'a.yaml', text: box('alder', 'wood') },
      { file: 'b.yaml', text: box('birch', 'wood') },
    ]
    const workspace =
      pushOf().workspace?.text.replace('clearances:', 'families: { wood: { title: Wood } }\nclearances:') ?? ''
    await team.author.call(endpoints.push, { params, body: pushOf({ sets, workspace }) })
    await server.work()
    await team.author.call(endpoints.changeSet, {
      params: { ...params, set: 'alder' },
      body: { tags: ['winter', 'winter'] },
    })
    const names = async (query: object) =>
      (await team.viewer.call(endpoints.sets, { params, query })).items.map(({ name }) => name)
    expect(await names({ search: 'title of a' })).toEqual(['alder'])
    expect(await names({ search: '0%_' })).toHaveLength(2)
    expect(await names({ search: 'a%b' })).toEqual([])
    expect(await names({ tag: 'winter' })).toEqual(['alder'])
    expect(await names({ branch: 'other' })).toEqual([])
    expect(await names({ state: 'passing', family: 'wood' })).toHaveLength(2)
    expect(await team.viewer.call(endpoints.setWords, { params })).toMatchObject({
      families: ['wood'],
      tags: ['winter'],
      branches: ['main'],
    })
    const holds = await team.viewer.call(endpoints.holds, { params, query: { length: 110, width: 150, height: 10 } })
    expect(holds.items[0]).toMatchObject({ piece: 'base', isTurned: true })
    expect(holds.items[0]?.goesIn).toBeGreaterThan(0.999)
    expect(holds.items.some(({ piece }) => piece === 'lid')).toBe(true)
    const tight = await team.viewer.call(endpoints.holds, { params, query: { length: 300, width: 200 } })
    expect(tight.items).toEqual([])
    const wrong = await team.viewer.refusal(endpoints.sets, { params, query: { cursor: 'bm9uc2Vuc2U' } })
    expect(wrong.code).toBe('bad-cursor')
  })
})
