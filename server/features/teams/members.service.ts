import type { EntityManager } from 'typeorm'
import type { Role } from '../../../shared/api/permissions.ts'
import type { Context } from '../../context.ts'
import { conflict, found } from '../../http/refusal.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Membership } from './membership.entity.ts'
import { Team } from './team.entity.ts'

export interface Member {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly role: Role
  readonly joinedAt: Date
}

export const membersOf = (manager: EntityManager, teamId: string): Promise<Member[]> =>
  manager.query(
    `select person.id, person.name, person.email, membership.role, membership.joined_at as "joinedAt"
     from membership join person on person.id = membership.person_id
     where membership.team_id = $1 order by lower(person.name), person.id`,
    [teamId],
  )

/** Locks the team so that two owners cannot step down at once. */
async function refuseLastOwner(manager: EntityManager, teamId: string, personId: string): Promise<void> {
  await manager.findOne(Team, { where: { id: teamId }, lock: { mode: 'pessimistic_write' } })
  const owners = await manager.findBy(Membership, { teamId, role: 'owner' })
  if (owners.length === 1 && owners[0]?.personId === personId)
    throw conflict(
      'last-owner',
      'This is the last owner of the team.',
      'Make somebody else an owner first, or delete the team.',
    )
}

export async function changeRole(context: Context, access: TeamAccess, personId: string, role: Role): Promise<Member> {
  const { team, actor } = access
  return context.database.transaction(async (manager) => {
    const before = found(await manager.findOneBy(Membership, { teamId: team.id, personId }))
    if (before.role === 'owner' && role !== 'owner') await refuseLastOwner(manager, team.id, personId)
    await manager.update(Membership, { teamId: team.id, personId }, { role })
    const member = found((await membersOf(manager, team.id)).find(({ id }) => id === personId))
    await recordAudit(manager, team.id, actor, {
      verb: 'changed role',
      kind: 'person',
      name: member.name,
      sentence: `made ${member.name} ${role}, who was ${before.role}`,
    })
    return member
  })
}

export async function removeMember(context: Context, access: TeamAccess, personId: string): Promise<void> {
  const { team, actor } = access
  await context.database.transaction(async (manager) => {
    const member = found((await membersOf(manager, team.id)).find(({ id }) => id === personId))
    if (member.role === 'owner') await refuseLastOwner(manager, team.id, personId)
    await manager.delete(Membership, { teamId: team.id, personId })
    const isSelf = actor.personId === personId
    await recordAudit(manager, team.id, actor, {
      verb: isSelf ? 'left' : 'removed',
      kind: 'person',
      name: member.name,
      sentence: isSelf ? 'left the team' : `took ${member.name} out of the team`,
    })
  })
}
