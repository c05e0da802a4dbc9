import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import type { Context } from '../../context.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { getVersion } from '../versions/version.repository.ts'
import { Comment } from './comment.entity.ts'
import { presentComment, presentReview } from './review.presenter.ts'
import { addComment, askReview, decide } from './review.service.ts'

const at = (context: Context, access: TeamAccess, params: { readonly set: string; readonly number: number }) =>
  getVersion(context.database.manager, access.team.id, params.set, params.number)

export const reviewRoutes: readonly Route[] = [
  teamRoute(endpoints.review, async ({ params, access, context }) => {
    const { version } = await at(context, access, params)
    return presentReview(context, access, version)
  }),
  teamRoute(endpoints.askReview, async ({ params, body, access, context }) => {
    const { set, version } = await at(context, access, params)
    await askReview(context, access, set, version, body.note)
    return presentReview(context, access, (await at(context, access, params)).version)
  }),
  teamRoute(endpoints.decide, async ({ params, body, access, context }) => {
    const { set, version } = await at(context, access, params)
    await decide(context, access, set, version, body)
    return presentReview(context, access, (await at(context, access, params)).version)
  }),
  teamRoute(endpoints.comment, async ({ params, body, access, context }) => {
    const { version } = await at(context, access, params)
    return presentComment(await addComment(context, access, version, body), access.actor.personId)
  }),
  teamRoute(endpoints.resolveComment, async ({ params, body, access, context }) => {
    const { manager } = context.database
    const where = { id: params.comment, teamId: access.team.id }
    found(await manager.findOneBy(Comment, where))
    const change = body.isResolved
      ? { resolvedAt: context.now(), resolvedBy: access.actor.name }
      : { resolvedAt: null, resolvedBy: null }
    await manager.update(Comment, where, change)
    return presentComment(found(await manager.findOneBy(Comment, where)), access.actor.personId)
  }),
]
