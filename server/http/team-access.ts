import { may, usualChoices, type Action, type Role, type TeamChoices } from '../../shared/api/permissions.ts'
import type { Endpoint } from '../../shared/api/endpoint.ts'
import type { Context } from '../context.ts'
import { Membership } from '../features/teams/membership.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import { actorOf, type Actor, type Caller, type PersonCaller, type RobotCaller } from './caller.ts'
import { forbidden, notFound, Refusal } from './refusal.ts'

/** A caller who belongs to a team and may do what the endpoint is for. */
export interface TeamAccess {
  readonly team: Team
  readonly choices: TeamChoices
  /** null for robots. */
  readonly role: Role | null
  readonly caller: PersonCaller | RobotCaller
  readonly actor: Actor
  may(action: Action): boolean
}

const signInFirst = (): Refusal =>
  new Refusal(401, 'signed-out', 'You are not signed in.', 'Sign in, or send a token of the team.')

/** Lets a caller into a team for an endpoint. @throws Refusal 401 signed out, 404 foreign, 403 not allowed */
export async function admit(context: Context, endpoint: Endpoint, slug: string, caller: Caller): Promise<TeamAccess> {
  if (caller === null) throw signInFirst()
  if (endpoint.access.kind !== 'team') throw new Error(`${endpoint.name} is not for teams`)
  const { action, scope } = endpoint.access
  const team = await context.database.manager.findOneBy(Team, { slug })
  if (team === null) throw notFound()
  const choices = { ...usualChoices, ...team.choices }
  if (caller.kind === 'robot') {
    if (caller.teamId !== team.id) throw notFound()
    if (scope === null || !caller.scopes.includes(scope))
      throw forbidden(
        `The token “${caller.name}” is not for this.`,
        scope === null ? 'Only people who are signed in may do it.' : `It needs the scope ${scope}.`,
      )
    return { team, choices, role: null, caller, actor: actorOf(caller), may: (asked) => asked === action }
  }
  const membership = await context.database.manager.findOneBy(Membership, { teamId: team.id, personId: caller.id })
  if (membership === null) throw notFound()
  const { role } = membership
  if (!may(role, action, choices)) throw forbidden(`As ${role} of ${team.name} you may not do this.`)
  return { team, choices, role, caller, actor: actorOf(caller), may: (asked) => may(role, asked, choices) }
}
