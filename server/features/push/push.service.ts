import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { BodyOf } from '../../../shared/api/endpoint.ts'
import type { pushEndpoints } from '../../../shared/api/push-endpoints.ts'
import { digestOf } from '../../../shared/report/digest.ts'
import type { Context } from '../../context.ts'
import { unacceptable } from '../../http/refusal.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { addVersion, keepTexts, textDigest } from '../versions/add-version.ts'
import { BranchState } from '../versions/branch-state.entity.ts'
import { judge, readTokens, type Judged } from '../versions/judge.ts'
import { Version } from '../versions/version.entity.ts'
import { PushVersion } from './push-version.entity.ts'
import { Push } from './push.entity.ts'
import { rippleCandidates } from './ripple.service.ts'

export type PushBody = BodyOf<(typeof pushEndpoints)['push']>

interface JudgedSet {
  readonly given: PushBody['sets'][number]
  readonly judged: Judged
}

/** Judges everything that was sent. @throws Refusal 422 with file and line where a set or the workspace cannot be read */
async function judgeAll(body: PushBody): Promise<readonly JudgedSet[]> {
  const workspace = readTokens(body.workspace)
  const judged: JudgedSet[] = []
  for (const given of body.sets)
    judged.push({ given, judged: await judge(given.text, given.file, workspace, body.judging) })
  const problems = judged.flatMap(({ judged: { report } }) => report.errors)
  if (problems.length > 0) {
    const seen = new Map(
      problems.map((problem) => [`${problem.at.file}:${String(problem.at.line)}:${problem.code}`, problem]),
    )
    const first = problems[0]
    throw unacceptable(
      'unreadable',
      `${String(seen.size)} ${seen.size === 1 ? 'thing' : 'things'} in what was sent cannot be understood${first === undefined ? '' : `, first ${first.at.file}:${String(first.at.line)}: ${first.message}`}`,
      'Nothing was stored. Run foldgauge check, mend it, and push again.',
      [...seen.values()]
        .slice(0, 100)
        .map(({ at, message, hint }) => ({ path: at.file, message: `${message} ${hint}`.trim(), line: at.line })),
    )
  }
  const names = judged.map(({ judged: { report } }) => report.set)
  const twice = names.find((name, index) => names.indexOf(name) !== index)
  if (twice !== undefined)
    throw unacceptable(
      'set-twice',
      `Two files are the set “${twice}”.`,
      'Give each set a name of its own behind `set:`.',
    )
  return judged
}

/** The sets of a push by name, made where they are new, locked in one order so that pushes cannot block one another. */
async function lockSets(
  context: Context,
  manager: EntityManager,
  teamId: string,
  judged: readonly JudgedSet[],
): Promise<ReadonlyMap<string, TemplateSet>> {
  const rows = judged
    .map(({ judged: { report } }) => ({
      id: randomUUID(),
      teamId,
      name: report.set,
      title: report.title,
      family: report.family,
      tags: [],
      createdAt: context.now(),
      updatedAt: context.now(),
    }))
    .toSorted((a, b) => (a.name < b.name ? -1 : 1))
  await manager.createQueryBuilder().insert().into(TemplateSet).values(rows).orIgnore().execute()
  const sets = await manager
    .createQueryBuilder(TemplateSet, 's')
    .where('s.teamId = :teamId and s.name = any(:names)', { teamId, names: rows.map(({ name }) => name) })
    .orderBy('s.name')
    .setLock('pessimistic_write')
    .getMany()
  return new Map(sets.map((set) => [set.name, set]))
}

export interface StoredPush {
  readonly push: Push
  readonly isNew: boolean
}

/** Stores a push whole or not at all. */
export async function storePush(context: Context, access: TeamAccess, body: PushBody): Promise<StoredPush> {
  const { team, actor } = access
  const branch = body.branch ?? team.mainBranch
  const judged = await judgeAll(body)
  const key = digestOf({
    branch,
    commit: body.commit,
    workspace: body.workspace?.text ?? null,
    sets: judged.map(({ given, judged: { identity } }) => [given.file, identity]).toSorted(),
  })
  return context.database.transaction(async (manager) => {
    const sets = await lockSets(context, manager, team.id, judged)
    const latest = await latestVersions(manager, [...sets.values()], branch)
    const isLatest = judged.every(({ judged: { report, identity } }) => latest.get(report.set)?.identity === identity)
    const known = await knownPush(manager, team.id, key, body.commit !== null || isLatest)
    if (known !== null) return { push: known, isNew: false }
    const push = manager.create(Push, {
      id: randomUUID(),
      teamId: team.id,
      // Without a commit the same content may come back on purpose after another: it is a push of its own then.
      contentKey: body.commit === null ? `${key}:${randomUUID()}` : key,
      branch,
      commit: body.commit,
      ancestors: [...body.ancestors],
      mergeBase: body.mergeBase,
      link: body.link,
      engine: body.engine,
      workspaceFile: body.workspace?.file ?? null,
      workspaceDigest: body.workspace === null ? null : textDigest(body.workspace.text),
      actorKind: actor.kind,
      actorName: actor.name,
      personId: actor.personId,
      createdAt: context.now(),
    })
    await manager.insert(Push, push)
    if (body.workspace !== null) await keepTexts(manager, team.id, [body.workspace.text])
    for (const { given, judged: one } of judged) {
      const set = sets.get(one.report.set)
      if (set === undefined) throw new Error(`the set ${one.report.set} was not locked`)
      const before = latest.get(set.name)
      const isSame = before?.identity === one.identity
      const version = isSame
        ? before
        : await addVersion(context, manager, {
            team,
            set,
            file: given.file,
            text: given.text,
            workspace: body.workspace,
            judging: body.judging,
            judged: one,
            push,
            origin: 'push',
            sender: { engine: body.engine, digest: given.digest, verdict: given.verdict },
            actor,
            isOlder: before === undefined ? false : await isAncestorOf(manager, body.commit, before.id),
          })
      if (isSame)
        await manager.update(
          BranchState,
          { setId: set.id, branch },
          { workspaceFile: push.workspaceFile, workspaceDigest: push.workspaceDigest },
        )
      await manager.insert(PushVersion, { pushId: push.id, versionId: version.id, isNew: !isSame, origin: 'push' })
    }
    if ((await rippleCandidates(manager, push, 1)).length > 0)
      await context.jobs.add(
        manager,
        'ripple',
        { pushId: push.id },
        { teamId: team.id, about: 'sets that use changed tokens' },
      )
    return { push, isNew: true }
  })
}

async function latestVersions(
  manager: EntityManager,
  sets: readonly TemplateSet[],
  branch: string,
): Promise<ReadonlyMap<string, Version>> {
  const versions = await manager
    .createQueryBuilder(Version, 'v')
    .innerJoin(BranchState, 'b', 'b.versionId = v.id')
    .where('b.setId = any(:ids) and b.branch = :branch', { ids: sets.map(({ id }) => id), branch })
    .getMany()
  const nameById = new Map(sets.map(({ id, name }) => [id, name]))
  return new Map(versions.map((version) => [nameById.get(version.setId) ?? '', version]))
}

/** The push of this very content, if it is here already: a retry, or the same state pushed twice. */
async function knownPush(manager: EntityManager, teamId: string, key: string, isRepeat: boolean): Promise<Push | null> {
  if (!isRepeat) return null
  return manager
    .createQueryBuilder(Push, 'p')
    .where('p.teamId = :teamId and (p.contentKey = :key or (p.contentKey > :from and p.contentKey < :to))', {
      teamId,
      key,
      from: `${key}:`,
      to: `${key};`,
    })
    .orderBy('p.createdAt', 'DESC')
    .limit(1)
    .getOne()
}

/** True where the branch's latest version came from a commit that had this one behind it: a late or repeated pipeline. */
async function isAncestorOf(manager: EntityManager, commit: string | null, versionId: string): Promise<boolean> {
  if (commit === null) return false
  const rows: unknown[] = await manager.query(
    `select 1 from push_version pv join push on push.id = pv.push_id
     where pv.version_id = $1 and $2 = any(push.ancestors) limit 1`,
    [versionId, commit],
  )
  return rows.length > 0
}
