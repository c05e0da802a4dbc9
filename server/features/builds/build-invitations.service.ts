import { randomUUID } from 'node:crypto'
import type { AnswerOf, BodyOf } from '../../../shared/api/endpoint.ts'
import type { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import type { Context } from '../../context.ts'
import { found, unacceptable } from '../../http/refusal.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Version } from '../versions/version.entity.ts'
import { BuildInvitation } from './build-invitation.entity.ts'
import type { Build } from './build.entity.ts'

type Invite = AnswerOf<(typeof buildEndpoints)['inviteTester']>

export const stampOf = (number: number, tester: number): string => `v${String(number)}-t${String(tester)}`

export function stateOfInvitation(invitation: BuildInvitation, build: Build | null, now: Date): Invite['state'] {
  if (build?.submittedAt != null) return 'submitted'
  if (invitation.revokedAt !== null) return 'revoked'
  if (invitation.expiresAt <= now) return 'expired'
  if (build !== null) return 'draft'
  return invitation.openedAt === null ? 'sent' : 'opened'
}

export const presentInvite = (invitation: BuildInvitation, number: number, build: Build | null, now: Date): Invite => ({
  id: invitation.id,
  email: invitation.email,
  name: invitation.name,
  stamp: stampOf(number, invitation.tester),
  version: number,
  state: stateOfInvitation(invitation, build, now),
  dueOn: invitation.dueOn,
  expiresAt: invitation.expiresAt.toISOString(),
  invitedBy: invitation.invitedBy,
  invitedAt: invitation.createdAt.toISOString(),
})

/** Invites somebody to build a version; the mail carries a link that works without an account. */
export async function inviteTester(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  version: Version,
  given: BodyOf<(typeof buildEndpoints)['inviteTester']>,
): Promise<BuildInvitation> {
  const { team, actor } = access
  if (version.verdict === 'invalid') throw unacceptable('unreadable', 'A version that cannot be read cannot be built.')
  const id = randomUUID()
  return context.database.transaction(async (manager) => {
    await manager.findOne(Version, { where: { id: version.id }, lock: { mode: 'pessimistic_write' } })
    const [{ next } = { next: 1 }]: { next: number }[] = await manager.query(
      'select coalesce(max(tester), 0) + 1 as next from build_invitation where version_id = $1',
      [version.id],
    )
    await manager.insert(BuildInvitation, {
      id,
      teamId: team.id,
      versionId: version.id,
      tester: next,
      email: given.email,
      name: given.name,
      note: given.note,
      dueOn: given.dueOn,
      inviterId: actor.personId,
      invitedBy: actor.name,
      createdAt: context.now(),
      expiresAt: new Date(context.now().getTime() + given.days * 86_400_000),
    })
    await context.jobs.add(
      manager,
      'mail-link',
      { link: 'build', id },
      { teamId: team.id, about: `invitation of ${given.name} to build ${set.name}` },
    )
    await recordAudit(manager, team.id, actor, {
      verb: 'invited',
      kind: 'tester',
      name: given.name,
      sentence: `invited ${given.name} to build ${set.name} version ${String(version.number)}`,
    })
    return found(await manager.findOneBy(BuildInvitation, { id }))
  })
}
