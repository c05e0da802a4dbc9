import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { reviewEndpoints } from '../../../shared/api/review-endpoints.ts'
import type { Context } from '../../context.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { blockersOf } from '../publication/blockers.ts'
import type { Version } from '../versions/version.entity.ts'
import { Comment } from './comment.entity.ts'
import { Decision } from './decision.entity.ts'
import { ReviewRequest } from './review-request.entity.ts'

type Answers = typeof reviewEndpoints

export const presentComment = (comment: Comment, ownId: string | null): AnswerOf<Answers['comment']> => ({
  id: comment.id,
  by: { kind: 'person', name: comment.writtenBy },
  isMine: comment.personId !== null && comment.personId === ownId,
  anchor: { kind: comment.anchorKind, name: comment.anchorName },
  body: comment.body,
  version: comment.number,
  createdAt: comment.createdAt.toISOString(),
  resolvedAt: comment.resolvedAt?.toISOString() ?? null,
  resolvedBy: comment.resolvedBy,
})

/** Decisions that were made on this or an earlier version of the set, newest first. */
const decisionsOf = (manager: EntityManager, version: Version): Promise<Decision[]> =>
  manager
    .createQueryBuilder(Decision, 'd')
    .where('d.setId = :setId and (d.content = :content or d.number <= :number)', version)
    .orderBy('d.createdAt', 'DESC')
    .limit(100)
    .getMany()

export async function presentReview(
  context: Context,
  access: TeamAccess,
  version: Version,
): Promise<AnswerOf<Answers['review']>> {
  const { manager } = context.database
  const asked = await manager.findOne(ReviewRequest, { where: { versionId: version.id }, order: { createdAt: 'DESC' } })
  const comments = await manager.find(Comment, {
    where: { versionId: version.id },
    order: { createdAt: 'ASC' },
    take: 500,
  })
  const whyNot = await blockersOf(context, version)
  return {
    state: version.reviewState,
    asked: asked === null ? null : { by: asked.askedBy, note: asked.note, at: asked.createdAt.toISOString() },
    decisions: (await decisionsOf(manager, version)).map((decision) => ({
      id: decision.id,
      by: { kind: 'person', name: decision.decidedBy },
      decision: decision.decision,
      note: decision.note,
      overrideReason: decision.overrideReason,
      version: decision.number,
      content: decision.content,
      isStale: decision.content !== version.content,
      decidedAt: decision.createdAt.toISOString(),
    })),
    comments: comments.map((comment) => presentComment(comment, access.actor.personId)),
    unresolved: comments.filter(({ resolvedAt }) => resolvedAt === null).length,
    canPublish: whyNot.length === 0 && access.may('publish'),
    whyNot: whyNot.map(({ sentence }) => sentence),
  }
}
