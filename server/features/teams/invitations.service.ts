import { randomUUID } from 'node:crypto'
import { IsNull } from 'typeorm'
import type { Role } from '../../../shared/api/permissions.ts'
import type { Context } from '../../context.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { conflict, found, Refusal } from '../../http/refusal.ts'
import { hashSecret } from '../../http/secrets.ts'
import { hashPassword, isPassword } from '../accounts/passwords.ts'
import { Person } from '../accounts/person.entity.ts'
import { findPersonByEmail } from '../accounts/person.repository.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Invitation } from './invitation.entity.ts'
import { Membership } from './membership.entity.ts'
import { Team } from './team.entity.ts'

const fortnight = 14 * 86_400_000

const over = (): Refusal =>
  new Refusal(
    410,
    'link-over',
    'This invitation has been accepted, taken back or is too old.',
    'Ask the team for a new one.',
  )

export type InvitationState = 'open' | 'accepted' | 'revoked' | 'expired'

export function stateOf(invitation: Invitation, now: Date): InvitationState {
  if (invitation.acceptedAt !== null) return 'accepted'
  if (invitation.revokedAt !== null) return 'revoked'
  return invitation.expiresAt <= now ? 'expired' : 'open'
}

/** Invites an address; an open invitation to it is replaced. */
export async function inviteMember(
  context: Context,
  access: TeamAccess,
  email: string,
  role: Role,
): Promise<Invitation> {
  const { team, actor } = access
  return context.database.transaction(async (manager) => {
    const person = await findPersonByEmail(manager, email)
    if (person !== null && (await manager.existsBy(Membership, { teamId: team.id, personId: person.id })))
      throw conflict('member-already', `${email} belongs to ${team.name} already.`, 'Change the role instead.')
    const open = { teamId: team.id, email, acceptedAt: IsNull(), revokedAt: IsNull() }
    await manager.update(Invitation, open, { revokedAt: context.now() })
    const invitation = manager.create(Invitation, {
      id: randomUUID(),
      teamId: team.id,
      email,
      role,
      invitedBy: actor.name,
      createdAt: context.now(),
      expiresAt: new Date(context.now().getTime() + fortnight),
    })
    await manager.insert(Invitation, invitation)
    await context.jobs.add(
      manager,
      'mail-link',
      { link: 'invitation', id: invitation.id },
      { teamId: team.id, about: `invitation of ${email}` },
    )
    await recordAudit(manager, team.id, actor, {
      verb: 'invited',
      kind: 'person',
      name: email,
      sentence: `invited ${email} as ${role}`,
    })
    return found(await manager.findOneBy(Invitation, { id: invitation.id }))
  })
}

export async function readInvitation(
  context: Context,
  secret: string,
): Promise<{ invitation: Invitation; team: Team; person: Person | null }> {
  const { manager } = context.database
  const invitation = await manager.findOneBy(Invitation, { secretHash: hashSecret(secret) })
  if (invitation === null || stateOf(invitation, context.now()) !== 'open') throw over()
  const team = found(await manager.findOneBy(Team, { id: invitation.teamId }))
  return { invitation, team, person: await findPersonByEmail(manager, invitation.email) }
}

/** Joins the team, with a new account where the address has none. @throws Refusal 403 for a wrong password */
export async function acceptInvitation(
  context: Context,
  secret: string,
  given: { readonly name?: string | undefined; readonly password: string },
): Promise<Person> {
  const read = await readInvitation(context, secret)
  if (read.person !== null && !(await isPassword(given.password, read.person.passwordHash, context.config)))
    throw new Refusal(403, 'wrong-password', 'An account with this address exists; its password is another.')
  const passwordHash = await hashPassword(given.password, context.config)
  return context.database.transaction(async (manager) => {
    const invitation = await manager.findOne(Invitation, {
      where: { id: read.invitation.id },
      lock: { mode: 'pessimistic_write' },
    })
    if (invitation === null || stateOf(invitation, context.now()) !== 'open') throw over()
    const person = read.person ?? (await addPerson())
    await manager.upsert(
      Membership,
      { teamId: invitation.teamId, personId: person.id, role: invitation.role, joinedAt: context.now() },
      ['teamId', 'personId'],
    )
    await manager.update(Invitation, { id: invitation.id }, { acceptedAt: context.now() })
    await recordAudit(
      manager,
      invitation.teamId,
      { kind: 'person', name: person.name, personId: person.id },
      {
        verb: 'joined',
        kind: 'team',
        name: read.team.name,
        sentence: `joined ${read.team.name} as ${invitation.role}`,
      },
    )
    return person

    async function addPerson(): Promise<Person> {
      const { email } = read.invitation
      const made = {
        id: randomUUID(),
        email,
        name: given.name ?? email.replace(/@.*/, ''),
        passwordHash,
        digestHour: 7,
        createdAt: context.now(),
      }
      await manager.insert(Person, made)
      return found(await manager.findOneBy(Person, { id: made.id }))
    }
  })
}
