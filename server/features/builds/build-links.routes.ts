import { randomUUID } from 'node:crypto'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { limits } from '../../../shared/api/limits.ts'
import { buildReportShape } from '../../../shared/api/shapes/build-shapes.ts'
import { conflict, found, unacceptable } from '../../http/refusal.ts'
import { openRoute, personRoute, type Route } from '../../http/route.ts'
import { keepPhoto, photoAnswer, removePhoto } from '../../storage/photo-files.ts'
import { buildForm } from './build-form.ts'
import { stampOf, stateOfInvitation } from './build-invitations.service.ts'
import { openLink, saveBuild, type OpenLink } from './build-links.service.ts'
import { BuildInvitation } from './build-invitation.entity.ts'
import { BuildPhoto } from './build-photo.entity.ts'
import { presentBuild, presentPhoto } from './build.presenter.ts'
import { Build } from './build.entity.ts'
import type { EntityManager } from 'typeorm'

const photoBase = (key: string): string => `/api/test-builds/${encodeURIComponent(key)}/photos/`

/** What the tester wrote of paper and tools the last time, so that it need not be written again. */
async function lastReport(manager: EntityManager, { invitation }: OpenLink) {
  const [row]: { report: unknown }[] = await manager.query(
    `select b.report from build b join build_invitation i on i.id = b.invitation_id
     where i.email = $1 and i.team_id = $2 and i.id <> $3 and b.submitted_at is not null order by b.submitted_at desc limit 1`,
    [invitation.email, invitation.teamId, invitation.id],
  )
  const read = buildReportShape.safeParse(row?.report)
  if (!read.success) return null
  const { sheet, printer, paper, tools, skill } = read.data
  return { sheet, printer, paper, tools, skill }
}

const draftOf = async (manager: EntityManager, link: OpenLink): Promise<Build> => {
  const build = await manager.findOneBy(Build, { invitationId: link.invitation.id })
  if (build === null) throw conflict('no-draft', 'Save the form before adding photographs.')
  return build
}

export const buildLinkRoutes: readonly Route[] = [
  personRoute(endpoints.myBuilds, async ({ caller, context }) => {
    const { manager } = context.database
    const rows: { id: string; title: string; team: string; number: number }[] = await manager.query(
      `select i.id, s.title, team.name as team, v.number from build_invitation i join version v on v.id = i.version_id
       join template_set s on s.id = v.set_id join team on team.id = i.team_id
       where i.email = $1 and i.revoked_at is null order by i.created_at desc limit 200`,
      [caller.email],
    )
    const items = []
    for (const row of rows) {
      const invitation = found(await manager.findOneBy(BuildInvitation, { id: row.id }))
      const build = await manager.findOneBy(Build, { invitationId: row.id })
      items.push({
        key: row.id,
        team: row.team,
        title: row.title,
        stamp: stampOf(row.number, invitation.tester),
        state: stateOfInvitation(invitation, build, context.now()),
        dueOn: invitation.dueOn,
      })
    }
    return { items }
  }),
  openRoute(endpoints.buildForm, async ({ params, caller, context }) => {
    const { manager } = context.database
    const link = await openLink(context, params.key, caller)
    const build = await manager.findOneBy(Build, { invitationId: link.invitation.id })
    return {
      form: buildForm(link.report, link.version, link.invitation, link.set.name, link.team.name),
      build: build === null ? null : await presentBuild(manager, build, photoBase(params.key)),
      last: await lastReport(manager, link),
    }
  }),
  openRoute(endpoints.saveBuild, async ({ params, body, caller, context }) => {
    const link = await openLink(context, params.key, caller)
    return presentBuild(context.database.manager, await saveBuild(context, link, body, false), photoBase(params.key))
  }),
  openRoute(endpoints.submitBuild, async ({ params, body, caller, context }) => {
    const link = await openLink(context, params.key, caller)
    return presentBuild(context.database.manager, await saveBuild(context, link, body, true), photoBase(params.key))
  }),
  openRoute(endpoints.addBuildPhoto, async ({ params, query, bytes, caller, context }) => {
    const { manager } = context.database
    const link = await openLink(context, params.key, caller)
    const build = await draftOf(manager, link)
    if ((await manager.countBy(BuildPhoto, { buildId: build.id })) >= limits.photosPerBuild)
      throw unacceptable(
        'enough-photos',
        `There are ${String(limits.photosPerBuild)} photographs already.`,
        'Take one back first.',
      )
    const kept = await keepPhoto(context, link.team.id, bytes)
    const id = randomUUID()
    await manager.insert(BuildPhoto, {
      id,
      teamId: link.team.id,
      buildId: build.id,
      key: kept.key,
      alt: query.alt,
      mayBePublished: query.mayBePublished === 'true',
      width: kept.width,
      height: kept.height,
      createdAt: context.now(),
    })
    return presentPhoto(found(await manager.findOneBy(BuildPhoto, { id })), photoBase(params.key))
  }),
  openRoute(endpoints.removeBuildPhoto, async ({ params, caller, context }) => {
    const { manager } = context.database
    const build = await draftOf(manager, await openLink(context, params.key, caller))
    const photo = found(await manager.findOneBy(BuildPhoto, { id: params.photo, buildId: build.id }))
    await manager.delete(BuildPhoto, { id: photo.id })
    await removePhoto(context, photo.key)
  }),
  openRoute(endpoints.ownBuildPhoto, async ({ params, query, caller, context }) => {
    const { manager } = context.database
    const build = await draftOf(manager, await openLink(context, params.key, caller))
    const photo = found(await manager.findOneBy(BuildPhoto, { id: params.photo, buildId: build.id }))
    return photoAnswer(context, photo.key, query.size)
  }),
]
