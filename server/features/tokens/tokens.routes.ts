import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { forbidden, found } from '../../http/refusal.ts'
import { callerRoute, teamRoute, type Route } from '../../http/route.ts'
import { Team } from '../teams/team.entity.ts'
import { ApiToken } from './api-token.entity.ts'
import { createToken, revokeToken, rotateToken, type MadeToken } from './tokens.service.ts'

const week = 7 * 86_400_000

type TokenAnswer = AnswerOf<typeof endpoints.tokens>['items'][number]

function stateOf(token: ApiToken, now: Date): TokenAnswer['state'] {
  if (token.revokedAt !== null) return 'revoked'
  if (token.expiresAt <= now) return 'expired'
  return token.expiresAt.getTime() - now.getTime() <= week ? 'expires-soon' : 'active'
}

const presentToken = (token: ApiToken, now: Date, ownId: string | null): TokenAnswer => ({
  id: token.id,
  name: token.name,
  hint: `fgt_${token.prefix}_…${token.lastFour}`,
  scopes: token.scopes,
  createdBy: token.creatorName,
  createdAt: token.createdAt.toISOString(),
  expiresAt: token.expiresAt.toISOString(),
  lastUsedAt: token.lastUsedAt?.toISOString() ?? null,
  state: stateOf(token, now),
  isMine: token.createdBy !== null && token.createdBy === ownId,
})

const presentMade = ({ token, secret }: MadeToken, now: Date, ownId: string | null) => ({
  token: presentToken(token, now, ownId),
  secret,
})

export const tokenRoutes: readonly Route[] = [
  teamRoute(endpoints.tokens, async ({ access, context }) => {
    const { personId } = access.actor
    const tokens = await context.database.manager.find(ApiToken, {
      where: { teamId: access.team.id },
      order: { createdAt: 'DESC' },
      take: 500,
    })
    const seen = tokens.filter((token) => access.may('tokens:manage') || token.createdBy === personId)
    return { items: seen.map((token) => presentToken(token, context.now(), personId)) }
  }),
  teamRoute(endpoints.createToken, async ({ body, access, context }) =>
    presentMade(await createToken(context, access, body), context.now(), access.actor.personId),
  ),
  teamRoute(endpoints.rotateToken, async ({ params, body, access, context }) =>
    presentMade(await rotateToken(context, access, params.token, body.days), context.now(), access.actor.personId),
  ),
  teamRoute(endpoints.revokeToken, async ({ params, access, context }) => {
    await revokeToken(context, access, params.token)
  }),
  teamRoute(endpoints.whoAmI, ({ access }) =>
    Promise.resolve({ team: access.team.slug, name: access.caller.name, kind: access.caller.kind }),
  ),
  callerRoute(endpoints.tokenCaller, async ({ caller, context }) => {
    if (caller.kind !== 'robot') throw forbidden('This is for tokens.', 'Send one as a bearer token.')
    const { manager } = context.database
    const token = found(await manager.findOneBy(ApiToken, { id: caller.tokenId }))
    const team = found(await manager.findOneBy(Team, { id: caller.teamId }))
    return { team: team.slug, name: token.name, scopes: token.scopes, expiresAt: token.expiresAt.toISOString() }
  }),
]
