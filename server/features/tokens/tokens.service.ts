import { randomBytes, randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { TokenScope } from '../../../shared/api/endpoint.ts'
import type { Context } from '../../context.ts'
import type { RobotCaller } from '../../http/caller.ts'
import { found } from '../../http/refusal.ts'
import { hashSecret, isSecret, makeSecret } from '../../http/secrets.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { ApiToken } from './api-token.entity.ts'

const day = 86_400_000
const minute = 60_000

/** `fgt_` so that leaked ones can be found by their look; then the part that finds them; then the secret. */
const pattern = /^fgt_([a-z0-9]{10})_([A-Za-z0-9_-]{43})$/

function makeToken(): { prefix: string; secret: string; whole: string } {
  const prefix = BigInt(`0x${randomBytes(8).toString('hex')}`)
    .toString(36)
    .padStart(13, '0')
    .slice(-10)
  const secret = makeSecret()
  return { prefix, secret, whole: `fgt_${prefix}_${secret}` }
}

export interface MadeToken {
  readonly token: ApiToken
  /** Shown once. */
  readonly secret: string
}

export async function createToken(
  context: Context,
  access: TeamAccess,
  given: { readonly name: string; readonly scopes: readonly TokenScope[]; readonly days: number },
): Promise<MadeToken> {
  const { prefix, secret, whole } = makeToken()
  const id = randomUUID()
  return context.database.transaction(async (manager) => {
    await manager.insert(ApiToken, {
      id,
      teamId: access.team.id,
      name: given.name,
      prefix,
      secretHash: hashSecret(secret),
      lastFour: secret.slice(-4),
      scopes: [...new Set(given.scopes)],
      createdBy: access.actor.personId,
      creatorName: access.actor.name,
      createdAt: context.now(),
      expiresAt: new Date(context.now().getTime() + given.days * day),
    })
    await recordAudit(manager, access.team.id, access.actor, {
      verb: 'made',
      kind: 'token',
      name: given.name,
      sentence: `made the token ${given.name} (${given.scopes.join(', ')}; ${String(given.days)} days)`,
    })
    return { token: found(await manager.findOneBy(ApiToken, { id })), secret: whole }
  })
}

/** Members see and change their own tokens, owners all. */
async function ownToken(manager: EntityManager, access: TeamAccess, id: string): Promise<ApiToken> {
  const token = found(await manager.findOneBy(ApiToken, { id, teamId: access.team.id }))
  return found(access.may('tokens:manage') || token.createdBy === access.actor.personId ? token : null)
}

export async function rotateToken(context: Context, access: TeamAccess, id: string, days: number): Promise<MadeToken> {
  const { prefix, secret, whole } = makeToken()
  return context.database.transaction(async (manager) => {
    const token = await ownToken(manager, access, id)
    await manager.update(
      ApiToken,
      { id },
      {
        prefix,
        secretHash: hashSecret(secret),
        lastFour: secret.slice(-4),
        expiresAt: new Date(context.now().getTime() + days * day),
        revokedAt: null,
        warnedAt: null,
      },
    )
    await recordAudit(manager, access.team.id, access.actor, {
      verb: 'rotated',
      kind: 'token',
      name: token.name,
      sentence: `gave the token ${token.name} a new secret`,
    })
    return { token: found(await manager.findOneBy(ApiToken, { id })), secret: whole }
  })
}

export async function revokeToken(context: Context, access: TeamAccess, id: string): Promise<void> {
  await context.database.transaction(async (manager) => {
    const token = await ownToken(manager, access, id)
    await manager.update(ApiToken, { id }, { revokedAt: context.now() })
    await recordAudit(manager, access.team.id, access.actor, {
      verb: 'revoked',
      kind: 'token',
      name: token.name,
      sentence: `revoked the token ${token.name}`,
    })
  })
}

/** The robot behind a token; null for one that is unknown, revoked or over. Its last use is noted to the minute. */
export async function findRobot(context: Context, whole: string): Promise<RobotCaller | null> {
  const match = pattern.exec(whole)
  if (match === null) return null
  const [, prefix = '', secret = ''] = match
  const { manager } = context.database
  const token = await manager.findOneBy(ApiToken, { prefix })
  if (token === null || !isSecret(secret, token.secretHash)) return null
  const now = context.now()
  if (token.revokedAt !== null || token.expiresAt <= now) return null
  if (token.lastUsedAt === null || now.getTime() - token.lastUsedAt.getTime() > minute)
    await manager.update(ApiToken, { id: token.id }, { lastUsedAt: now })
  return {
    kind: 'robot',
    tokenId: token.id,
    teamId: token.teamId,
    name: token.name,
    makerId: token.createdBy,
    scopes: token.scopes,
  }
}
