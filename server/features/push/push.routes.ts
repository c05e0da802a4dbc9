import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { withStatus } from '../../http/answers.ts'
import { found } from '../../http/refusal.ts'
import { teamRoute, type Route } from '../../http/route.ts'
import { presentPush } from './push.presenter.ts'
import { Push } from './push.entity.ts'
import { storePush } from './push.service.ts'

export const pushRoutes: readonly Route[] = [
  teamRoute(endpoints.push, async ({ body, access, context }) => {
    const { push, isNew } = await storePush(context, access, body)
    return withStatus(isNew ? 201 : 200, await presentPush(context.database.manager, access.team.slug, push, isNew))
  }),
  teamRoute(endpoints.pushState, async ({ params, access, context: { database } }) => {
    const push = found(await database.manager.findOneBy(Push, { id: params.push, teamId: access.team.id }))
    return presentPush(database.manager, access.team.slug, push, false)
  }),
]
