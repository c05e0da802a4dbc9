import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam, stranger, type TestTeam } from './support/agent.ts'
import { boxText, pushOf, tightLid, workspaceText } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
let count = 0
beforeAll(async () => {
  server = await startTestServer()
})
afterAll(() => server.stop())

const freshTeam = async (): Promise<TestTeam> => {
  count += 1
  return createTeam(server, `review-${String(count)}`)
}
const at = (number: number) => ({ team: team.slug, set: 'boxed-notes', number })
const setAt = () => ({ team: team.slug, set: 'boxed-notes' })

async function push(text = boxText(), workspace = workspaceText()): Promise<number> {
  const body = pushOf({ sets: [{ file: 'sets/a.yaml', text }], workspace })
  const stored = await team.author.call(endpoints.push, { params: { team: team.slug }, body })
  await server.work()
  return stored.sets[0]?.number ?? 0
}

async function approve(who: TestTeam['owner'], number: number, overrideReason: string | null = null): Promise<string> {
  const { content } = await who.call(endpoints.version, { params: at(number) })
  return (
    await who.call(endpoints.decide, { params: at(number), body: { decision: 'approve', content, overrideReason } })
  ).state
}

const publish = (number: number, label: string, overrideReason: string | null = null) =>
  team.owner.call(endpoints.publish, { params: at(number), body: { label, overrideReason } })

describe('review', () => {
  it('takes a version from asking over comments to approval, and tells those concerned', async () => {
    team = await freshTeam()
    await push()
    const asked = await team.author.call(endpoints.askReview, { params: at(1), body: { note: 'The lid is new.' } })
    expect(asked).toMatchObject({ state: 'asked', canPublish: false, asked: { note: 'The lid is new.' } })
    const comment = await team.reviewer.call(endpoints.comment, {
      params: at(1),
      body: { anchor: { kind: 'fit', name: 'lid-on-base' }, body: 'Is 10 mm enough to hold on to?' },
    })
    const missing = await team.reviewer.refusal(endpoints.comment, {
      params: at(1),
      body: { anchor: { kind: 'piece', name: 'drawer' }, body: 'Where?' },
    })
    expect(missing.message).toMatch(/no piece called drawer/)
    expect((await team.viewer.call(endpoints.review, { params: at(1) })).unresolved).toBe(1)
    await team.author.call(endpoints.resolveComment, {
      params: { team: team.slug, comment: comment.id },
      body: { isResolved: true },
    })
    expect(await approve(team.reviewer, 1)).toBe('approved')
    await server.work()
    const subjects = (role: string) =>
      server.mail.mails
        .filter(({ to }) => to.includes(`${team.slug}-${role}@quillfern.example`))
        .map(({ subject }) => subject)
    expect(subjects('reviewer')).toContain('Review asked: Boxed notes')
    expect(subjects('author')).toContain('Approved: Boxed notes')
    expect(subjects('viewer')).toEqual([])
  })

  it('holds for the content it was given on: another text, token or only the day', async () => {
    team = await freshTeam()
    await push()
    await approve(team.reviewer, 1)
    expect(await push(boxText({ lid: '178 x 136 mm' }))).toBe(2)
    expect((await team.viewer.call(endpoints.version, { params: at(2) })).review).toBe('stale')
    expect(await push(boxText())).toBe(3)
    expect((await team.viewer.call(endpoints.version, { params: at(3) })).review).toBe('approved')
    expect(await push(boxText(), workspaceText({ extra: '  spare: { caliper: 0.2 mm }\n' }))).toBe(3)
    expect(await push(boxText(), workspaceText({ caliper: '0.31 mm' }))).toBe(4)
    const { state, decisions } = await team.viewer.call(endpoints.review, { params: at(4) })
    expect(state).toBe('stale')
    expect(decisions).toMatchObject([{ isStale: true, version: 1 }])
  })

  it('does not let an author approve their own work alone, unless with a reason or where the team lets them', async () => {
    team = await freshTeam()
    await push()
    expect(await approve(team.author, 1)).toBe('none')
    expect(await approve(team.author, 1, 'Nobody else is here this week.')).toBe('approved')
    const { decisions } = await team.viewer.call(endpoints.review, { params: at(1) })
    expect(decisions.some(({ overrideReason }) => overrideReason === 'Nobody else is here this week.')).toBe(true)
    team = await freshTeam()
    await team.owner.call(endpoints.changeTeam, {
      params: { team: team.slug },
      body: { choices: { authorMayApproveAlone: true } },
    })
    await push()
    expect(await approve(team.author, 1)).toBe('approved')
  })

  it('counts the last word of each reviewer, and changes outweigh approval', async () => {
    team = await freshTeam()
    await push()
    await approve(team.reviewer, 1)
    const { content } = await team.owner.call(endpoints.version, { params: at(1) })
    const asked = await team.owner.call(endpoints.decide, {
      params: at(1),
      body: { decision: 'ask-changes', content, note: 'Wider.' },
    })
    expect(asked.state).toBe('changes-asked')
    expect(await approve(team.owner, 1)).toBe('approved')
    const other = `sha256:${'0'.repeat(64)}`
    const stale = await team.owner.refusal(endpoints.decide, {
      params: at(1),
      body: { decision: 'approve', content: other },
    })
    expect(stale.status).toBe(409)
  })

  it('keeps approvals over changes of words where the team wants it so', async () => {
    team = await freshTeam()
    await team.owner.call(endpoints.changeTeam, {
      params: { team: team.slug },
      body: { choices: { wordsKeepApproval: true } },
    })
    await push()
    await approve(team.reviewer, 1)
    await push(boxText({ title: 'Boxed notes, winter' }))
    expect((await team.viewer.call(endpoints.version, { params: at(2) })).review).toBe('approved')
    await push(boxText({ title: 'Boxed notes, winter', lid: '178 x 136 mm' }))
    expect((await team.viewer.call(endpoints.version, { params: at(3) })).review).toBe('stale')
  })
})

describe('known failures', () => {
  it('are accepted until a day with a reason, and lapse visibly', async () => {
    team = await freshTeam()
    await push()
    await push(boxText({ lid: tightLid }))
    const { report } = await team.reviewer.call(endpoints.version, { params: at(2) })
    const failing = report.verdicts.filter(({ status }) => status === 'fail')
    const until = '2026-12-20'
    for (const { fingerprint } of failing)
      await team.reviewer.call(endpoints.acceptFailure, {
        params: setAt(),
        body: { fingerprint, reason: 'Mended in January.', until },
      })
    const state = async () => (await team.viewer.call(endpoints.set, { params: setAt() })).state
    expect(await state()).toBe('known-failing')
    const other = await team.reviewer.refusal(endpoints.acceptFailure, {
      params: setAt(),
      body: { fingerprint: 'fit/clearance#nothing', reason: 'x', until },
    })
    expect(other.code).toBe('not-failing')
    server.later(22 * 86_400_000)
    await server.context.database.transaction((manager) =>
      server.context.jobs.add(manager, 'upkeep', {}, { teamId: null, about: 'upkeep' }),
    )
    await server.work()
    expect(server.lines.filter((line) => line.includes('job failed'))).toEqual([])
    const { items } = await team.viewer.call(endpoints.knownFailures, { params: setAt() })
    expect(items.every((item) => item.state === 'lapsed')).toBe(true)
    expect(['failing', 'newly-failing']).toContain(await state())
    server.later(-22 * 86_400_000)
  })
})

describe('publication', () => {
  it('needs a passing report and an approval, and names everything in the way', async () => {
    team = await freshTeam()
    await push(boxText({ lid: tightLid }))
    const refused = await team.owner.refusal(endpoints.publish, { params: at(1), body: { label: '1.0.0' } })
    expect(refused.problems.map(({ path }) => path)).toEqual(['failing', 'unapproved'])
    const despite = await team.owner.refusal(endpoints.publish, {
      params: at(1),
      body: { label: '1.0.0', overrideReason: 'Hurry.' },
    })
    expect(despite.problems.map(({ path }) => path)).toEqual(['failing'])
    await push()
    expect((await publish(2, '1.0.0', 'The reviewer is ill.')).label).toBe('1.0.0')
    const { items } = await team.owner.call(endpoints.audit, { params: { team: team.slug } })
    expect(items[0]?.sentence).toMatch(/without approval, because: The reviewer is ill/)
  })

  it('gives labels that never change, keeps exports and licence, and becomes the baseline', async () => {
    team = await freshTeam()
    await team.owner.call(endpoints.changeTeam, {
      params: { team: team.slug },
      body: { licence: 'Make fifty a year.' },
    })
    await push()
    await approve(team.reviewer, 1)
    const proposal = await team.author.call(endpoints.proposal, { params: at(1) })
    expect(proposal).toMatchObject({ label: '1.0.0', step: 'first', blockers: [] })
    await publish(1, proposal.label)
    await server.work()
    await team.owner.call(endpoints.changeTeam, { params: { team: team.slug }, body: { licence: 'Other words.' } })
    const [published] = (await team.viewer.call(endpoints.publications, { params: setAt() })).items
    expect(published).toMatchObject({ label: '1.0.0', licence: 'Make fifty a year.', exports: 'ready', version: 1 })
    const pdf = published?.files.find(({ name }) => name.endsWith('-a4.pdf'))
    const file = await fetch(`${server.url}${pdf?.path ?? ''}`, { headers: { cookie: team.viewer.cookie() } })
    expect(
      Buffer.from(await file.arrayBuffer())
        .subarray(0, 5)
        .toString(),
    ).toBe('%PDF-')
    expect((await team.owner.refusal(endpoints.publish, { params: at(1), body: { label: '1.0.1' } })).status).toBe(422)

    await push(boxText({ lid: '180 x 138 mm' }))
    const version = await team.viewer.call(endpoints.version, { params: at(2) })
    expect(version.baseline).toMatchObject({ number: 1, reason: 'published' })
    await approve(team.reviewer, 2)
    const low = await team.owner.refusal(endpoints.publish, { params: at(2), body: { label: '0.9.0' } })
    expect(low.code).toBe('label-too-low')
    const next = await team.author.call(endpoints.proposal, { params: at(2) })
    expect(next.label).toBe(next.step === 'major' ? '2.0.0' : '1.1.0')
  })

  it('tells makers of errata and recalls without removing anything; the public page is off until switched on', async () => {
    team = await freshTeam()
    await push()
    await approve(team.reviewer, 1)
    await publish(1, '1.0.0')
    await push(boxText({ lid: '178 x 136 mm' }))
    await approve(team.reviewer, 2)
    await publish(2, '1.1.0')
    await server.work()
    const erratum = await team.owner.call(endpoints.addErratum, {
      params: setAt(),
      body: {
        labels: ['1.0.0'],
        pieces: ['lid'],
        symptom: 'The lid is tight.',
        severity: 'cosmetic',
        replacement: '1.1.0',
      },
    })
    expect(erratum.oldPiecesMate).toBe(true)
    expect(erratum.mating.length).toBeGreaterThan(0)
    expect((await team.owner.call(endpoints.set, { params: setAt() })).publicPage).toBeNull()
    const { publicPage } = await team.author.call(endpoints.changeSet, { params: setAt(), body: { isPublic: true } })
    const page = publicPage?.replace('/public/', '') ?? ''
    const seen = await stranger(server).call(endpoints.publicPage, { params: { page } })
    expect(seen).toMatchObject({ label: '1.1.0', recalled: null, others: [{ label: '1.0.0', isRecalled: false }] })
    await team.owner.call(endpoints.recall, {
      params: { ...setAt(), label: '1.1.0' },
      body: { reason: 'A wrong mark.' },
    })
    const after = await stranger(server).call(endpoints.publicPage, { params: { page }, query: { label: '1.1.0' } })
    expect(after).toMatchObject({ recalled: { reason: 'A wrong mark.' }, files: [] })
    expect((await stranger(server).call(endpoints.publicPage, { params: { page } })).label).toBe('1.0.0')
    const gone = await fetch(`${server.url}/api/public/${page}/1.1.0/boxed-notes-a4.pdf`)
    expect(gone.status).toBe(410)
    await team.author.call(endpoints.changeSet, { params: setAt(), body: { isPublic: false } })
    expect((await stranger(server).refusal(endpoints.publicPage, { params: { page } })).status).toBe(404)
  })
})

describe('the number sheet', () => {
  it('carries ticks to the next version only where the measure is unchanged', async () => {
    team = await freshTeam()
    await push()
    const { items, open } = await team.reviewer.call(endpoints.numberSheet, { params: at(1) })
    expect(open).toBe(items.length)
    const keys = items.map(({ key }) => key)
    const all = await team.reviewer.call(endpoints.tick, { params: at(1), body: { keys, state: 'ticked' } })
    expect(all).toMatchObject({ ticked: items.length, open: 0 })
    await push(boxText({ lid: '178 x 135 mm' }))
    const next = await team.viewer.call(endpoints.numberSheet, { params: at(2) })
    const state = Object.fromEntries(next.items.map((item) => [item.key, item.state]))
    expect(state).toMatchObject({
      'base/blank-length': 'ticked',
      'lid/blank-width': 'ticked',
      'lid/blank-length': 'changed',
      'lid/scored-length': 'changed',
      'lid-on-base/clearance-length': 'changed',
      'lid-on-base/clearance-width': 'ticked',
    })
    expect(next.items.find(({ key }) => key === 'base/wall')?.carriedFrom).toBe(1)
    const text = await team.viewer.call(endpoints.numberSheetCsv, { params: at(2) })
    expect(String(text).split('\r\n')[0]).toContain('mm mark,inch mark')
  })
})
