import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { BodyOf } from '../../../shared/api/endpoint.ts'
import type { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import type { Context } from '../../context.ts'
import { conflict, found, unacceptable } from '../../http/refusal.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { announce, setPage } from '../notices/announce.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Version } from '../versions/version.entity.ts'
import { VersionContent } from '../versions/version-content.entity.ts'
import { Comment } from './comment.entity.ts'
import { Decision } from './decision.entity.ts'
import { decidedState } from './review-state.ts'
import { ReviewRequest } from './review-request.entity.ts'

const nameOf = (set: TemplateSet, version: Version): string => `${set.name} version ${String(version.number)}`

/** Puts a version up for review and tells those who review. */
export async function askReview(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  version: Version,
  note: string,
): Promise<void> {
  const { team, actor } = access
  if (version.verdict === 'invalid')
    throw unacceptable('unreadable', 'A version that cannot be read cannot be reviewed.')
  await context.database.transaction(async (manager) => {
    await manager.insert(ReviewRequest, {
      id: randomUUID(),
      versionId: version.id,
      note,
      personId: actor.personId,
      askedBy: actor.name,
      createdAt: context.now(),
    })
    if (version.reviewState === 'none' || version.reviewState === 'stale')
      await manager.update(Version, { id: version.id }, { reviewState: 'asked' })
    await recordAudit(manager, team.id, actor, {
      verb: 'asked for review',
      kind: 'version',
      name: nameOf(set, version),
      sentence: `put ${nameOf(set, version)} up for review`,
    })
    await announce(context, manager, {
      teamId: team.id,
      event: 'review-asked',
      subject: `Review asked: ${set.title}`,
      sentence: `${actor.name} asks for a review of version ${String(version.number)} of ${set.title}.`,
      page: setPage(team, set.name, version.number),
      by: actor.personId,
      data: { set: set.name, version: version.number },
    })
  })
}

/** The review state of every version of a content, after somebody decided. */
async function refreshReviewState(manager: EntityManager, version: Version): Promise<void> {
  const decided = await decidedState(manager, version.teamId, version.setId, version.content)
  const asked = await manager.existsBy(ReviewRequest, { versionId: version.id })
  await manager.update(
    Version,
    { setId: version.setId, content: version.content },
    { reviewState: decided ?? (asked ? 'asked' : 'none') },
  )
}

/** Approves, or asks for changes. @throws Refusal 409 where the version is not what the decider read */
export async function decide(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  version: Version,
  given: BodyOf<(typeof reviewEndpoints)['decide']>,
): Promise<void> {
  const { team, actor } = access
  if (given.content !== version.content)
    throw conflict('other-content', 'You decided on another content than this version has.', 'Read the version again.')
  if (version.verdict === 'invalid')
    throw unacceptable('unreadable', 'A version that cannot be read cannot be approved.')
  const isApproval = given.decision === 'approve'
  await context.database.transaction(async (manager) => {
    await manager.findOne(Version, { where: { id: version.id }, lock: { mode: 'pessimistic_write' } })
    await manager.insert(Decision, {
      id: randomUUID(),
      setId: set.id,
      versionId: version.id,
      number: version.number,
      content: version.content,
      decision: given.decision,
      note: given.note,
      isOwn: actor.personId !== null && actor.personId === version.personId,
      overrideReason: given.overrideReason,
      personId: actor.personId,
      decidedBy: actor.name,
      createdAt: context.now(),
    })
    await refreshReviewState(manager, version)
    const why = given.overrideReason === null ? '' : ` although it is their own, because: ${given.overrideReason}`
    await recordAudit(manager, team.id, actor, {
      verb: isApproval ? 'approved' : 'asked for changes',
      kind: 'version',
      name: nameOf(set, version),
      sentence: isApproval ? `approved ${nameOf(set, version)}${why}` : `asked for changes of ${nameOf(set, version)}`,
    })
    await announce(context, manager, {
      teamId: team.id,
      event: isApproval ? 'approved' : 'changes-asked',
      subject: isApproval ? `Approved: ${set.title}` : `Changes asked: ${set.title}`,
      sentence: `${actor.name} ${isApproval ? 'approved' : 'asks for changes of'} version ${String(version.number)} of ${set.title}.`,
      page: setPage(team, set.name, version.number),
      by: actor.personId,
      data: { set: set.name, version: version.number },
    })
  })
}

/** Adds a comment. @throws Refusal 422 where the version has no such fit or piece */
export async function addComment(
  context: Context,
  access: TeamAccess,
  version: Version,
  given: BodyOf<(typeof reviewEndpoints)['comment']>,
): Promise<Comment> {
  const { manager } = context.database
  const { kind, name } = given.anchor
  if (name !== null) {
    const { report } = found(await manager.findOneBy(VersionContent, { versionId: version.id }))
    const isThere = kind === 'fit' ? report.fits.some(({ id }) => id === name) : name in report.pieces
    if (!isThere) throw unacceptable('no-such-part', `This version has no ${kind} called ${name}.`)
  }
  const id = randomUUID()
  await manager.insert(Comment, {
    id,
    teamId: access.team.id,
    versionId: version.id,
    number: version.number,
    anchorKind: kind,
    anchorName: name,
    body: given.body,
    personId: access.actor.personId,
    writtenBy: access.actor.name,
    createdAt: context.now(),
  })
  return found(await manager.findOneBy(Comment, { id }))
}
