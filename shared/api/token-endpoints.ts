import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { words } from './shapes/words.ts'

const group = 'Tokens'
const inTeam = z.strictObject({ team: words.slug })
const tokenPath = inTeam.extend({ token: words.id })

export const tokenShape = z
  .strictObject({
    id: words.id,
    name: words.name,
    hint: z.string().describe('how it begins and its last four characters'),
    scopes: z.array(z.enum(['push', 'read'])),
    createdBy: z.string(),
    createdAt: words.moment,
    expiresAt: words.moment,
    lastUsedAt: words.moment.nullable(),
    state: z.enum(['active', 'expires-soon', 'expired', 'revoked']),
    isMine: z.boolean(),
  })
  .meta({ id: 'ApiToken' })

const madeShape = z.strictObject({ token: tokenShape, secret: z.string().describe('shown this once') })

/** Tokens of robots: they belong to the team, not to who made them. */
export const tokenEndpoints = {
  tokens: defineEndpoint('tokens', 'get', '/api/teams/{team}/tokens', {
    group,
    summary: 'The own tokens; for owners all of the team',
    access: teamMay('tokens:own'),
    params: inTeam,
    answer: z.strictObject({ items: z.array(tokenShape) }),
  }),
  createToken: defineEndpoint('createToken', 'post', '/api/teams/{team}/tokens', {
    group,
    summary: 'Make a token; its secret is in this answer and nowhere else',
    access: teamMay('tokens:own'),
    params: inTeam,
    body: z.strictObject({
      name: words.name,
      scopes: z.array(z.enum(['push', 'read'])).min(1),
      days: z.int().min(1).max(366).default(90),
    }),
    answer: madeShape,
  }),
  rotateToken: defineEndpoint('rotateToken', 'post', '/api/teams/{team}/tokens/{token}/rotation', {
    group,
    summary: 'Give a token a new secret; the old one stops at once',
    access: teamMay('tokens:own'),
    params: tokenPath,
    body: z.strictObject({ days: z.int().min(1).max(366).default(90) }),
    answer: madeShape,
  }),
  revokeToken: defineEndpoint('revokeToken', 'delete', '/api/teams/{team}/tokens/{token}', {
    group,
    summary: 'Revoke a token',
    access: teamMay('tokens:own'),
    params: tokenPath,
  }),
  whoAmI: defineEndpoint('whoAmI', 'get', '/api/teams/{team}/caller', {
    group,
    summary: 'Whether a token is good, for which team and what',
    access: teamMay('sets:read', 'read'),
    params: inTeam,
    answer: z.strictObject({ team: words.slug, name: words.name, kind: z.enum(['person', 'robot']) }),
  }),
  tokenCaller: defineEndpoint('tokenCaller', 'get', '/api/token', {
    group,
    summary: 'What the token that is sent is good for',
    access: { kind: 'signed-in' },
    answer: z.strictObject({
      team: words.slug,
      name: words.name,
      scopes: z.array(z.enum(['push', 'read'])),
      expiresAt: words.moment,
    }),
  }),
} as const
