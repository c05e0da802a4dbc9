import { randomUUID } from 'node:crypto'
import type { BuildReport } from '../../../shared/api/shapes/build-shapes.ts'
import type { Context } from '../../context.ts'
import type { Caller } from '../../http/caller.ts'
import { found, notFound, Refusal, unacceptable } from '../../http/refusal.ts'
import { hashSecret } from '../../http/secrets.ts'
import { announce, setPage } from '../notices/announce.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { Team } from '../teams/team.entity.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import type { Report } from '../../../shared/report/report.ts'
import { Version } from '../versions/version.entity.ts'
import { textsOf } from '../versions/version.repository.ts'
import { namedDimensions } from './build-form.ts'
import { stampOf } from './build-invitations.service.ts'
import { BuildInvitation } from './build-invitation.entity.ts'
import { Build } from './build.entity.ts'

const idPattern = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/

/** What a link opens: one version, to one tester. */
export interface OpenLink {
  readonly invitation: BuildInvitation
  readonly version: Version
  readonly set: TemplateSet
  readonly team: Team
  readonly report: Report
}

/** The invitation of a link's secret, or of its id for the person it was addressed to. @throws Refusal 404, 410 */
export async function openLink(context: Context, key: string, caller: Caller): Promise<OpenLink> {
  const { manager } = context.database
  const byId = idPattern.test(key)
  const invitation = await manager.findOneBy(BuildInvitation, byId ? { id: key } : { secretHash: hashSecret(key) })
  const isTheirs = !byId || (caller?.kind === 'person' && caller.email === invitation?.email)
  if (invitation === null || !isTheirs) throw notFound('There is no invitation at this address.')
  if (invitation.revokedAt !== null || invitation.expiresAt <= context.now())
    throw new Refusal(410, 'link-over', 'This invitation has ended.', 'Ask whoever invited you for a new one.')
  if (invitation.openedAt === null)
    await manager.update(BuildInvitation, { id: invitation.id }, { openedAt: context.now() })
  const version = found(await manager.findOneBy(Version, { id: invitation.versionId }))
  return {
    invitation,
    version,
    set: found(await manager.findOneBy(TemplateSet, { id: version.setId })),
    team: found(await manager.findOneBy(Team, { id: version.teamId })),
    report: (await textsOf(manager, version.id)).content.report,
  }
}

/** What a report names must be in the version. @throws Refusal 422 with each name that is not */
export function checkNames(report: Report, given: BuildReport): void {
  const keys = new Set(namedDimensions(report).map(({ key }) => key))
  const fits = new Set(report.fits.map(({ id }) => id))
  const problems = [
    ...given.readings
      .filter(({ key }) => !keys.has(key))
      .map(({ key }) => ({ path: key, message: 'no such dimension', line: null })),
    ...given.fits
      .filter(({ fit }) => !fits.has(fit))
      .map(({ fit }) => ({ path: fit, message: 'no such fit', line: null })),
    ...given.problems
      .filter(({ piece }) => !(piece in report.pieces))
      .map(({ piece }) => ({ path: piece, message: 'no such piece', line: null })),
  ]
  if (problems.length > 0)
    throw unacceptable(
      'no-such-part',
      `This version has no ${problems[0]?.path ?? ''}.`,
      'Load the form again.',
      problems,
    )
}

/** Keeps what a tester has filled in; with `isSubmitted` sends it in and tells the team. */
export async function saveBuild(
  context: Context,
  link: OpenLink,
  given: BuildReport,
  isSubmitted: boolean,
): Promise<Build> {
  const { invitation, version, set, team } = link
  checkNames(link.report, given)
  return context.database.transaction(async (manager) => {
    await manager.findOne(BuildInvitation, { where: { id: invitation.id }, lock: { mode: 'pessimistic_write' } })
    const before = await manager.findOneBy(Build, { invitationId: invitation.id })
    if (before !== null && before.submittedAt !== null && !isSubmitted) return before
    const submittedAt = isSubmitted ? context.now() : null
    const id = before?.id ?? randomUUID()
    if (before !== null) await manager.update(Build, { id }, { report: given as never, submittedAt })
    else
      await manager.insert(Build, {
        id,
        teamId: team.id,
        versionId: version.id,
        invitationId: invitation.id,
        stamp: stampOf(version.number, invitation.tester),
        tester: invitation.name,
        source: 'tester',
        report: given as never,
        startedAt: context.now(),
        submittedAt,
      })
    if (isSubmitted && before?.submittedAt == null) {
      const actor = { kind: 'tester' as const, name: invitation.name, personId: null }
      const what = `${set.name} version ${String(version.number)}`
      await recordAudit(manager, team.id, actor, {
        verb: 'reported',
        kind: 'build',
        name: what,
        sentence: `reported a build of ${what}`,
      })
      await announce(context, manager, {
        teamId: team.id,
        event: 'build-reported',
        subject: `Build reported: ${set.title}`,
        sentence: `${invitation.name} reported a build of version ${String(version.number)} of ${set.title}${given.problems.length > 0 ? `, with ${String(given.problems.length)} problems` : ''}.`,
        page: setPage(team, set.name, version.number),
        by: null,
        data: { set: set.name, version: version.number },
      })
    }
    return found(await manager.findOneBy(Build, { id }))
  })
}
