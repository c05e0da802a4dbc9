import { randomUUID } from 'node:crypto'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { may, usualChoices } from '../../../shared/api/permissions.ts'
import { isUniqueViolation } from '../../db/unique-violation.ts'
import { actorOf } from '../../http/caller.ts'
import { conflict, found, unacceptable } from '../../http/refusal.ts'
import { openRoute, personRoute, teamRoute, type Route } from '../../http/route.ts'
import { presentMe } from '../accounts/me.presenter.ts'
import { openSession } from '../accounts/sign-in.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { deleteTeam } from './delete-team.ts'
import { exportTeam } from './export-team.ts'
import { Invitation } from './invitation.entity.ts'
import { acceptInvitation, inviteMember, readInvitation } from './invitations.service.ts'
import { Membership } from './membership.entity.ts'
import { changeRole, membersOf, removeMember } from './members.service.ts'
import { presentInvitation, presentMember, presentTeam } from './team.presenter.ts'
import { Team } from './team.entity.ts'

const myId = (caller: { readonly kind: string; readonly id?: string }): string => caller.id ?? ''

export const teamRoutes: readonly Route[] = [
  personRoute(endpoints.createTeam, async ({ body, caller, context }) => {
    const id = randomUUID()
    try {
      await context.database.transaction(async (manager) => {
        await manager.insert(Team, { id, slug: body.slug, name: body.name, createdAt: context.now() })
        await manager.insert(Membership, { teamId: id, personId: caller.id, role: 'owner', joinedAt: context.now() })
        await recordAudit(manager, id, actorOf(caller), {
          verb: 'made',
          kind: 'team',
          name: body.name,
          sentence: `made the team ${body.name}`,
        })
      })
    } catch (error) {
      if (isUniqueViolation(error, 'team_slug'))
        throw conflict('slug-taken', `“${body.slug}” is taken.`, 'Choose another short name.')
      throw error
    }
    const team = found(await context.database.manager.findOneBy(Team, { id }))
    return presentTeam(team, { role: 'owner', may: (action) => may('owner', action, usualChoices) })
  }),
  teamRoute(endpoints.team, ({ access }) => Promise.resolve(presentTeam(access.team, access))),
  teamRoute(endpoints.changeTeam, async ({ body, access, context }) => {
    const { choices, name, mainBranch, licence } = body
    const change = {
      ...(name === undefined ? {} : { name }),
      ...(mainBranch === undefined ? {} : { mainBranch }),
      ...(licence === undefined ? {} : { licence }),
      ...(choices === undefined
        ? {}
        : {
            choices: { ...access.choices, ...(JSON.parse(JSON.stringify(choices)) as Partial<typeof access.choices>) },
          }),
    }
    await context.database.transaction(async (manager) => {
      if (Object.keys(change).length === 0) return
      await manager.update(Team, { id: access.team.id }, change)
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'changed',
        kind: 'team',
        name: access.team.name,
        sentence: `changed ${Object.keys(change).join(', ')} of the team`,
      })
    })
    return presentTeam(found(await context.database.manager.findOneBy(Team, { id: access.team.id })), access)
  }),
  teamRoute(endpoints.members, async ({ access, context }) => ({
    items: (await membersOf(context.database.manager, access.team.id)).map((member) =>
      presentMember(member, myId(access.caller as never)),
    ),
  })),
  teamRoute(endpoints.changeRole, async ({ params, body, access, context }) =>
    presentMember(await changeRole(context, access, params.person, body.role), myId(access.caller as never)),
  ),
  teamRoute(endpoints.removeMember, async ({ params, access, context }) => {
    await removeMember(context, access, params.person)
  }),
  teamRoute(endpoints.leaveTeam, async ({ access, context }) => {
    await removeMember(context, access, access.actor.personId ?? '')
  }),
  teamRoute(endpoints.invitations, async ({ access, context }) => {
    const invitations = await context.database.manager.find(Invitation, {
      where: { teamId: access.team.id },
      order: { createdAt: 'DESC' },
      take: 200,
    })
    return { items: invitations.map((invitation) => presentInvitation(invitation, context.now())) }
  }),
  teamRoute(endpoints.invite, async ({ body, access, context }) =>
    presentInvitation(await inviteMember(context, access, body.email, body.role), context.now()),
  ),
  teamRoute(endpoints.revokeInvitation, async ({ params, access, context }) => {
    await context.database.transaction(async (manager) => {
      const where = { id: params.invitation, teamId: access.team.id }
      const invitation = found(await manager.findOneBy(Invitation, where))
      await manager.update(Invitation, where, { revokedAt: context.now() })
      await recordAudit(manager, access.team.id, access.actor, {
        verb: 'took back',
        kind: 'person',
        name: invitation.email,
        sentence: `took back the invitation of ${invitation.email}`,
      })
    })
  }),
  openRoute(endpoints.invitationByLink, async ({ params, context }) => {
    const { invitation, team, person } = await readInvitation(context, params.secret)
    return {
      team: team.name,
      role: invitation.role,
      email: invitation.email,
      invitedBy: invitation.invitedBy,
      hasAccount: person !== null,
      expiresAt: invitation.expiresAt.toISOString(),
    }
  }),
  openRoute(endpoints.acceptInvitation, async ({ params, body, context, request }) => {
    const person = await acceptInvitation(context, params.secret, body)
    await openSession(request, context, person)
    return presentMe(context.database.manager, person)
  }),
  teamRoute(endpoints.exportTeam, async ({ access, context }) => exportTeam(context, access)),
  teamRoute(endpoints.deleteTeam, async ({ body, access, context }) => {
    if (body.confirm !== access.team.slug)
      throw unacceptable('not-confirmed', `Write “${access.team.slug}” to delete the team.`)
    await deleteTeam(context, access)
  }),
]
