import type { EntityManager } from 'typeorm'
import type { Context } from '../../context.ts'
import { todayOf } from '../../context.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { Team } from '../teams/team.entity.ts'
import { addVersion } from '../versions/add-version.ts'
import { BranchState } from '../versions/branch-state.entity.ts'
import { judge, readTokens } from '../versions/judge.ts'
import { SourceText } from '../versions/source-text.entity.ts'
import { Version } from '../versions/version.entity.ts'
import { textsOf } from '../versions/version.repository.ts'
import { PushVersion } from './push-version.entity.ts'
import { Push } from './push.entity.ts'

export interface RippleCandidate {
  readonly setId: string
  readonly name: string
  readonly versionId: string
}

/**
 * Sets that were not pushed but whose latest version, on the branch or else on the main one, was last judged with
 * another text of the same workspace file.
 * @param only looks at this set alone
 */
export const rippleCandidates = (
  manager: EntityManager,
  push: Push,
  limit: number,
  only: string | null = null,
): Promise<RippleCandidate[]> =>
  push.workspaceDigest === null
    ? Promise.resolve([])
    : manager.query(
        `select s.id as "setId", s.name, latest.version_id as "versionId"
         from template_set s join team on team.id = s.team_id
         cross join lateral (
           select b.version_id, b.workspace_file, b.workspace_digest from branch_state b
           where b.set_id = s.id and b.branch in ($2, team.main_branch)
           order by b.branch = $2 desc limit 1
         ) latest
         where s.team_id = $1 and ($7::uuid is null or s.id = $7)
           and latest.workspace_file = $3 and latest.workspace_digest <> $4
           and not exists (
             select 1 from push_version pv join version pushed on pushed.id = pv.version_id
             where pv.push_id = $5 and pushed.set_id = s.id)
         order by s.name limit $6`,
        [push.teamId, push.branch, push.workspaceFile, push.workspaceDigest, push.id, limit, only],
      )

/** Judges one set again with the workspace of a push; a version is added only where its verdicts or content differ. */
async function rippleOne(
  context: Context,
  push: Push,
  team: Team,
  tokens: { file: string; text: string },
  candidate: RippleCandidate,
): Promise<void> {
  const before = await context.database.manager.findOneBy(Version, { id: candidate.versionId })
  if (before === null) return
  const { text, content } = await textsOf(context.database.manager, before.id)
  const { workmanship, paper, scale } = content
  const judging = { asOf: todayOf(context), workmanship, paper, scale }
  const judged = await judge(text, before.file, readTokens(tokens), judging)
  const report = { ...judged.report, set: candidate.name }
  await context.database.transaction(async (manager) => {
    const set = await manager.findOne(TemplateSet, {
      where: { id: candidate.setId },
      lock: { mode: 'pessimistic_write' },
    })
    if (set === null) return
    // Somebody pushed it meanwhile, or this job was begun before.
    const [still] = await rippleCandidates(manager, push, 1, set.id)
    if (still?.versionId !== before.id) return
    const isSame = judged.identity === before.identity
    const version = isSame
      ? before
      : await addVersion(context, manager, {
          team,
          set,
          file: before.file,
          text,
          workspace: tokens,
          judging,
          judged: { ...judged, report },
          push,
          origin: 'ripple',
          sender: { engine: push.engine, digest: null, verdict: null },
          actor: { kind: push.actorKind, name: push.actorName, personId: push.personId },
          isOlder: false,
        })
    if (before.branch === push.branch || !isSame)
      await manager
        .createQueryBuilder()
        .insert()
        .into(PushVersion)
        .values({ pushId: push.id, versionId: version.id, isNew: !isSame, origin: 'ripple' })
        .orIgnore()
        .execute()
    if (isSame)
      await manager.update(
        BranchState,
        { setId: set.id, branch: push.branch },
        { workspaceDigest: push.workspaceDigest },
      )
  })
}

/** Judges every other set of the workspace again after its tokens changed. */
export async function ripple(context: Context, pushId: string): Promise<void> {
  const { manager } = context.database
  const push = await manager.findOneBy(Push, { id: pushId })
  if (push?.workspaceDigest == null || push.workspaceFile === null) return
  const team = await manager.findOneBy(Team, { id: push.teamId })
  const tokens = await manager.findOneBy(SourceText, { teamId: push.teamId, digest: push.workspaceDigest })
  if (team === null || tokens === null) return
  const workspace = { file: push.workspaceFile, text: tokens.text }
  for (const candidate of await rippleCandidates(manager, push, 1_000_000))
    await rippleOne(context, push, team, workspace, candidate)
}
