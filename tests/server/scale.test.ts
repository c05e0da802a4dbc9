import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam, type TestTeam } from './support/agent.ts'
import { boxText, pushOf } from './support/demo-push.ts'
import { multiply } from './support/multiply.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
const versions = 100_000
const sets = 5_000

beforeAll(async () => {
  server = await startTestServer()
  team = await createTeam(server, 'large')
  for (const lid of ['177 x 135 mm', '178 x 136 mm'])
    await team.author.call(endpoints.push, {
      params: { team: 'large' },
      body: pushOf({ sets: [{ file: 'a.yaml', text: boxText({ lid }) }] }),
    })
  await server.work()
  await multiply(server.context.database, { versions, sets, notices: 50_000, entries: 50_000 })
}, 120_000)
afterAll(() => server.stop())

interface Plan {
  readonly 'Node Type': string
  readonly 'Relation Name'?: string
  readonly 'Actual Rows'?: number
  readonly Plans?: readonly Plan[]
}

/** Tables that grow with use; reading one of them whole for a page would be slow one day. */
const growing = new Set([
  'version',
  'version_content',
  'template_set',
  'audit_entry',
  'notice',
  'push',
  'push_version',
  'library_piece',
])

function wholeReads(plan: Plan): readonly string[] {
  const own =
    plan['Node Type'] === 'Seq Scan' && growing.has(plan['Relation Name'] ?? '') ? [plan['Relation Name'] ?? ''] : []
  return [...own, ...(plan.Plans ?? []).flatMap(wholeReads)]
}

/** The plans of every query that a call makes. */
async function plansOf(call: () => Promise<unknown>): Promise<readonly Plan[]> {
  const { database } = server.context
  const seen: { readonly sql: string; readonly values: readonly unknown[] | undefined }[] = []
  const silent = () => undefined
  database.setOptions({
    logging: ['query'],
    logger: {
      logQuery: (sql: string, values?: unknown[]) => void seen.push({ sql, values }),
      logQueryError: silent,
      logQuerySlow: silent,
      logSchemaBuild: silent,
      logMigration: silent,
      log: silent,
    },
  } as never)
  await call()
  database.setOptions({ logging: false } as never)
  const plans: Plan[] = []
  for (const { sql, values } of seen.filter(({ sql }) => /^\s*(select|with)/i.test(sql))) {
    const [row]: { 'QUERY PLAN': readonly [{ readonly Plan: Plan }] }[] = await database.query(
      `explain (format json) ${sql}`,
      [...(values ?? [])],
    )
    if (row !== undefined) plans.push(row['QUERY PLAN'][0].Plan)
  }
  return plans
}

const inTeam = { team: 'large' }
const inSet = { ...inTeam, set: 'boxed-notes' }

describe(`with ${String(versions)} versions and ${String(sets)} sets`, () => {
  it.each([
    ['the sets', () => team.viewer.call(endpoints.sets, { params: inTeam })],
    [
      'a later page of sets',
      async () => {
        const { next } = await team.viewer.call(endpoints.sets, { params: inTeam, query: { limit: 200 } })
        return team.viewer.call(endpoints.sets, { params: inTeam, query: { cursor: next ?? '' } })
      },
    ],
    ['a set', () => team.viewer.call(endpoints.set, { params: inSet })],
    ['its versions', () => team.viewer.call(endpoints.versions, { params: inSet })],
    ['a branch of them', () => team.viewer.call(endpoints.versions, { params: inSet, query: { branch: 'side' } })],
    ['those in review', () => team.viewer.call(endpoints.versions, { params: inSet, query: { review: 'asked' } })],
    ['a version', () => team.viewer.call(endpoints.version, { params: { ...inSet, number: 2 } })],
    [
      'a comparison',
      () => team.viewer.call(endpoints.compare, { params: { ...inSet, number: 2 }, query: { with: 1 } }),
    ],
    ['the trend', () => team.viewer.call(endpoints.trend, { params: inSet })],
    ['the audit', () => team.owner.call(endpoints.audit, { params: inTeam })],
    ['the notices', () => team.owner.call(endpoints.notices, { params: inTeam })],
    ['a review', () => team.viewer.call(endpoints.review, { params: { ...inSet, number: 2 } })],
  ] as const)('%s are found by indexes', async (_, call) => {
    const plans = await plansOf(call)
    expect(plans.length).toBeGreaterThan(0)
    expect(plans.flatMap(wholeReads)).toEqual([])
  })

  it('pages through every version once, newest first', async () => {
    const seen: number[] = []
    let cursor: string | undefined
    for (let page = 0; page < 12; page += 1) {
      const answer = await team.viewer.call(endpoints.versions, {
        params: inSet,
        query: { limit: 200, ...(cursor === undefined ? {} : { cursor }) },
      })
      seen.push(...answer.items.map(({ number }) => number))
      cursor = answer.next ?? undefined
    }
    expect(seen).toHaveLength(2_400)
    expect(seen).toEqual(seen.toSorted((a, b) => b - a))
    expect(new Set(seen).size).toBe(2_400)
  })

  it('pages through every set once', async () => {
    const seen: string[] = []
    let cursor: string | undefined
    do {
      const answer = await team.viewer.call(endpoints.sets, {
        params: inTeam,
        query: { limit: 200, ...(cursor === undefined ? {} : { cursor }) },
      })
      seen.push(...answer.items.map(({ name }) => name))
      cursor = answer.next ?? undefined
    } while (cursor !== undefined)
    expect(seen).toHaveLength(sets + 1)
    expect(new Set(seen).size).toBe(sets + 1)
  })
})
