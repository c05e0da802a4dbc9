import { createHash, randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import { engineVersion } from '../../../shared/edition.ts'
import type { Context } from '../../context.ts'
import { todayOf } from '../../context.ts'
import type { Actor } from '../../http/caller.ts'
import { refreshLibrary } from '../sets/library.ts'
import { refreshSetState } from '../sets/set-state.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import type { Team } from '../teams/team.entity.ts'
import { reviewStateFor } from '../review/review-state.ts'
import { baselineFacts } from './baseline.repository.ts'
import { BranchState } from './branch-state.entity.ts'
import { chooseBaseline } from './choose-baseline.ts'
import type { Judged, Judging } from './judge.ts'
import { SourceText } from './source-text.entity.ts'
import { VersionContent } from './version-content.entity.ts'
import { Version } from './version.entity.ts'
import { worstFitOf } from './worst-fit.ts'

export interface NewVersion {
  readonly team: Team
  /** Locked by the caller. */
  readonly set: TemplateSet
  readonly file: string
  readonly text: string
  readonly workspace: { readonly file: string; readonly text: string } | null
  readonly judging: Judging
  readonly judged: Judged
  readonly push: {
    readonly branch: string
    readonly commit: string | null
    readonly ancestors: readonly string[]
    readonly mergeBase: string | null
    readonly link: string | null
  }
  readonly origin: 'push' | 'ripple'
  readonly sender: {
    readonly engine: string
    readonly digest: string | null
    readonly verdict: Version['senderVerdict']
  }
  readonly actor: Actor
  /** The branch has moved on since: it is kept but is not the branch's latest. */
  readonly isOlder: boolean
}

export const textDigest = (text: string): string => createHash('sha256').update(text).digest('hex')

/** Where both engines judged alike, nothing; else what differs. */
function differenceOf({ judged: { report }, sender }: NewVersion): string | null {
  if (sender.verdict !== null && sender.verdict !== report.summary.verdict)
    return `the sender’s engine ${sender.engine} said ${sender.verdict}; checked here by ${engineVersion} it is ${report.summary.verdict}`
  if (sender.engine === engineVersion && sender.digest !== null && sender.digest !== report.digest)
    return `the sender judged something else with the same engine: its digest is ${sender.digest.slice(0, 19)}…, here it is ${report.digest.slice(0, 19)}…`
  return null
}

/** Keeps texts by their digests. */
export async function keepTexts(manager: EntityManager, teamId: string, texts: readonly string[]): Promise<void> {
  const rows = [...new Map(texts.map((text) => [textDigest(text), text]))].map(([digest, text]) => ({
    teamId,
    digest,
    text,
  }))
  await manager.createQueryBuilder().insert().into(SourceText).values(rows).orIgnore().execute()
}

/** Stores a version with everything that follows from it, and enqueues its comparison, all in one transaction. */
export async function addVersion(context: Context, manager: EntityManager, given: NewVersion): Promise<Version> {
  const { team, set, judged, push, workspace, actor } = given
  const { report } = judged
  const baseline = chooseBaseline(await baselineFacts(manager, set, team.mainBranch, push))
  const { pass, info, warn, fail, waived, unchecked, crashed } = report.summary
  const number = set.lastNumber + 1
  const version = manager.create(Version, {
    id: randomUUID(),
    teamId: team.id,
    setId: set.id,
    number,
    branch: push.branch,
    commit: push.commit,
    link: push.link,
    origin: given.origin,
    file: given.file,
    title: report.title,
    family: report.family,
    units: report.units,
    digest: report.digest,
    content: judged.content,
    identity: judged.identity,
    engine: report.engine,
    rules: report.rules,
    asOf: report.asOf,
    verdict: report.summary.verdict,
    works: report.summary.works,
    counts: { pass, info, warn, fail, waived, unchecked, crashed },
    worstFit: worstFitOf(report),
    failing: report.verdicts.filter(({ status }) => status === 'fail').map(({ fingerprint }) => fingerprint),
    differs: differenceOf(given),
    senderEngine: given.sender.engine,
    senderDigest: given.sender.digest,
    senderVerdict: given.sender.verdict,
    actorKind: actor.kind,
    actorName: actor.name,
    personId: actor.personId,
    baselineId: baseline.versionId,
    baselineNumber: baseline.number,
    baselineReason: baseline.reason,
    baselineSentence: baseline.sentence,
    baselineBy: baseline.by,
    changeState: 'pending',
    changeSentence: 'being compared',
    newlyFailing: 0,
    nowPassing: 0,
    reviewState: await reviewStateFor(manager, set, push.branch, judged.content),
    createdAt: context.now(),
  })
  await keepTexts(manager, team.id, workspace === null ? [given.text] : [given.text, workspace.text])
  await manager.insert(Version, version)
  await manager.insert(VersionContent, {
    versionId: version.id,
    teamId: team.id,
    textDigest: textDigest(given.text),
    workspaceFile: workspace?.file ?? null,
    workspaceDigest: workspace === null ? null : textDigest(workspace.text),
    workmanship: given.judging.workmanship,
    paper: given.judging.paper,
    scale: given.judging.scale,
    report: report as never,
  })
  set.lastNumber = number
  await manager.update(TemplateSet, { id: set.id }, { lastNumber: number })
  if (!given.isOlder) await showVersion(context, manager, given, version)
  await context.jobs.add(
    manager,
    'compare-version',
    { versionId: version.id },
    { teamId: team.id, about: `comparison of ${set.name} version ${String(number)}` },
  )
  return version
}

/** The version is the latest of its branch, and what the list shows unless the main branch has one. */
async function showVersion(
  context: Context,
  manager: EntityManager,
  given: NewVersion,
  version: Version,
): Promise<void> {
  const { team, set, push, judged } = given
  await manager.upsert(
    BranchState,
    {
      setId: set.id,
      branch: push.branch,
      teamId: team.id,
      versionId: version.id,
      workspaceFile: given.workspace?.file ?? null,
      workspaceDigest: given.workspace === null ? null : textDigest(given.workspace.text),
      updatedAt: context.now(),
    },
    ['setId', 'branch'],
  )
  const hasMain =
    push.branch === team.mainBranch || (await manager.existsBy(BranchState, { setId: set.id, branch: team.mainBranch }))
  if (hasMain && push.branch !== team.mainBranch) return
  const { report } = judged
  // A set that cannot be read keeps its title: the broken text may not even tell it.
  const named = report.summary.verdict === 'invalid' ? {} : { title: report.title, family: report.family }
  Object.assign(set, named, { shownVersionId: version.id })
  await manager.update(TemplateSet, { id: set.id }, { ...named, shownVersionId: version.id, updatedAt: context.now() })
  if (report.summary.verdict !== 'invalid') await refreshLibrary(manager, set, version.number, report)
  await refreshSetState(manager, set.id, todayOf(context))
}
