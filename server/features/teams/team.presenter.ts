import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { actions, usualChoices } from '../../../shared/api/permissions.ts'
import type { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import type { Invitation } from './invitation.entity.ts'
import { stateOf } from './invitations.service.ts'
import type { Member } from './members.service.ts'
import type { Team } from './team.entity.ts'

type Answers = typeof teamEndpoints

export const presentTeam = (team: Team, access: Pick<TeamAccess, 'role' | 'may'>): AnswerOf<Answers['team']> => ({
  slug: team.slug,
  name: team.name,
  mainBranch: team.mainBranch,
  licence: team.licence,
  choices: { ...usualChoices, ...team.choices },
  role: access.role,
  may: actions.filter((action) => access.may(action)),
  createdAt: team.createdAt.toISOString(),
})

export const presentMember = (member: Member, ownId: string): AnswerOf<Answers['changeRole']> => ({
  ...member,
  joinedAt: member.joinedAt.toISOString(),
  isMe: member.id === ownId,
})

export const presentInvitation = (invitation: Invitation, now: Date): AnswerOf<Answers['invite']> => ({
  id: invitation.id,
  email: invitation.email,
  role: invitation.role,
  invitedBy: invitation.invitedBy,
  createdAt: invitation.createdAt.toISOString(),
  expiresAt: invitation.expiresAt.toISOString(),
  state: stateOf(invitation, now),
})
