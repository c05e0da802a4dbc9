import { z } from 'zod'
import { defineEndpoint, signedIn, teamMay } from './define-endpoint.ts'
import { limits } from './limits.ts'
import { actions } from './permissions.ts'
import { words } from './shapes/words.ts'

const group = 'Teams'
const inTeam = z.strictObject({ team: words.slug })

const choicesShape = z.strictObject({
  authorsPublish: z.boolean(),
  authorMayApproveAlone: z.boolean(),
  wordsKeepApproval: z.boolean(),
})

export const teamShape = z
  .strictObject({
    slug: words.slug,
    name: words.name,
    mainBranch: words.branch,
    licence: z.string().max(limits.licence).describe('text pinned to what is published from now on'),
    choices: choicesShape,
    role: words.role.nullable().describe('own role; null for robots'),
    may: z.array(z.enum(actions)).describe('what the caller may do here'),
    createdAt: words.moment,
  })
  .meta({ id: 'Team' })

const memberShape = z
  .strictObject({
    id: words.id,
    name: words.name,
    email: z.string(),
    role: words.role,
    joinedAt: words.moment,
    isMe: z.boolean(),
  })
  .meta({ id: 'Member' })

const invitationShape = z
  .strictObject({
    id: words.id,
    email: z.string(),
    role: words.role,
    invitedBy: z.string(),
    createdAt: words.moment,
    expiresAt: words.moment,
    state: z.enum(['open', 'accepted', 'revoked', 'expired']),
  })
  .meta({ id: 'Invitation' })

const memberPath = inTeam.extend({ person: words.id })

/** Teams, members and invitations. */
export const teamEndpoints = {
  createTeam: defineEndpoint('createTeam', 'post', '/api/teams', {
    group,
    summary: 'Make a team and own it',
    access: signedIn,
    body: z.strictObject({ slug: words.slug, name: words.name }),
    answer: teamShape,
  }),
  team: defineEndpoint('team', 'get', '/api/teams/{team}', {
    group,
    summary: 'A team, and what the caller may do in it',
    access: teamMay('notices:choose', 'read'),
    params: inTeam,
    answer: teamShape,
  }),
  changeTeam: defineEndpoint('changeTeam', 'patch', '/api/teams/{team}', {
    group,
    summary: 'Change name, main branch, licence or choices',
    access: teamMay('team:manage'),
    params: inTeam,
    body: z.strictObject({
      name: words.name.optional(),
      mainBranch: words.branch.optional(),
      licence: z.string().max(limits.licence).optional(),
      choices: choicesShape.partial().optional(),
    }),
    answer: teamShape,
  }),
  members: defineEndpoint('members', 'get', '/api/teams/{team}/members', {
    group,
    summary: 'Everybody in the team',
    access: teamMay('team:read'),
    params: inTeam,
    answer: z.strictObject({ items: z.array(memberShape) }),
  }),
  changeRole: defineEndpoint('changeRole', 'patch', '/api/teams/{team}/members/{person}', {
    group,
    summary: 'Give a member another role; the last owner stays one',
    access: teamMay('team:manage'),
    params: memberPath,
    body: z.strictObject({ role: words.role }),
    answer: memberShape,
  }),
  removeMember: defineEndpoint('removeMember', 'delete', '/api/teams/{team}/members/{person}', {
    group,
    summary: 'Take a member out of the team; the last owner stays',
    access: teamMay('team:manage'),
    params: memberPath,
  }),
  leaveTeam: defineEndpoint('leaveTeam', 'delete', '/api/teams/{team}/membership', {
    group,
    summary: 'Leave the team; the last owner cannot',
    access: teamMay('notices:choose'),
    params: inTeam,
  }),
  invitations: defineEndpoint('invitations', 'get', '/api/teams/{team}/invitations', {
    group,
    summary: 'Invitations, newest first',
    access: teamMay('team:manage'),
    params: inTeam,
    answer: z.strictObject({ items: z.array(invitationShape) }),
  }),
  invite: defineEndpoint('invite', 'post', '/api/teams/{team}/invitations', {
    group,
    summary: 'Invite somebody by mail; a new invitation to the same address replaces the old',
    access: teamMay('team:manage'),
    params: inTeam,
    body: z.strictObject({ email: words.email, role: words.role }),
    answer: invitationShape,
  }),
  revokeInvitation: defineEndpoint('revokeInvitation', 'delete', '/api/teams/{team}/invitations/{invitation}', {
    group,
    summary: 'Take an invitation back',
    access: teamMay('team:manage'),
    params: inTeam.extend({ invitation: words.id }),
  }),
  deleteTeam: defineEndpoint('deleteTeam', 'delete', '/api/teams/{team}', {
    group,
    summary: 'Delete the team with everything in it; `confirm` repeats its slug',
    access: teamMay('team:delete'),
    params: inTeam,
    body: z.strictObject({ confirm: words.slug }),
  }),
  exportTeam: defineEndpoint('exportTeam', 'get', '/api/teams/{team}/export', {
    group,
    summary: 'Everything the team owns as one JSON document, streamed',
    access: teamMay('team:export'),
    params: inTeam,
    answerKind: 'file',
  }),
} as const
