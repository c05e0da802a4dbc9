import type { EntityManager } from 'typeorm'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import type { Context } from '../../context.ts'
import { fileAnswer, type FileAnswer } from '../../http/answers.ts'
import { found, Refusal } from '../../http/refusal.ts'
import { openRoute, teamRoute, type Route } from '../../http/route.ts'
import { photoAnswer } from '../../storage/photo-files.ts'
import { findSet, getVersion } from '../versions/version.repository.ts'
import { presentErratum, presentPublication } from './publication.presenter.ts'
import { PublishedFile } from './published-file.entity.ts'
import { presentPublicPage, publicSet } from './public-page.ts'
import { Publication } from './publication.entity.ts'
import { proposePublication } from './proposal.service.ts'
import { addErratum, publish, recall } from './publish.service.ts'

async function sendFile(
  context: Context,
  publication: Publication,
  name: string,
  keep: FileAnswer['keep'],
): Promise<FileAnswer> {
  const file = found(await context.database.manager.findOneBy(PublishedFile, { publicationId: publication.id, name }))
  const object = found(await context.objects.get(file.key))
  return fileAnswer(file.type, object.body, file.name, keep)
}

const getPublication = async (manager: EntityManager, setId: string, label: string): Promise<Publication> =>
  found(await manager.findOneBy(Publication, { setId, label }))

export const publicationRoutes: readonly Route[] = [
  teamRoute(endpoints.publications, async ({ params, access, context: { database } }) => {
    const { manager } = database
    const set = found(await findSet(manager, access.team.id, params.set))
    const all = await manager.find(Publication, { where: { setId: set.id }, order: { publishedAt: 'DESC' }, take: 200 })
    const items = []
    for (const publication of all) items.push(await presentPublication(manager, access.team.slug, set, publication))
    return { items }
  }),
  teamRoute(endpoints.proposal, async ({ params, access, context }) => {
    const { set, version } = await getVersion(context.database.manager, access.team.id, params.set, params.number)
    return proposePublication(context, access, set, version)
  }),
  teamRoute(endpoints.publish, async ({ params, body, access, context }) => {
    const { manager } = context.database
    const { set, version } = await getVersion(manager, access.team.id, params.set, params.number)
    return presentPublication(manager, access.team.slug, set, await publish(context, access, set, version, body))
  }),
  teamRoute(endpoints.publishedFile, async ({ params, access, context }) => {
    const { manager } = context.database
    const set = found(await findSet(manager, access.team.id, params.set))
    return sendFile(context, await getPublication(manager, set.id, params.label), params.file, 'private')
  }),
  teamRoute(endpoints.addErratum, async ({ params, body, access, context }) => {
    const set = found(await findSet(context.database.manager, access.team.id, params.set))
    return presentErratum(await addErratum(context, access, set, body))
  }),
  teamRoute(endpoints.recall, async ({ params, body, access, context }) => {
    const { manager } = context.database
    const set = found(await findSet(manager, access.team.id, params.set))
    const publication = await recall(context, access, set, params.label, body.reason)
    return presentPublication(manager, access.team.slug, set, publication)
  }),
  openRoute(endpoints.publicPage, ({ params, query, context: { database } }) =>
    presentPublicPage(database.manager, params.page, query.label),
  ),
  openRoute(endpoints.publicPhoto, async ({ params, context }) => {
    const set = await publicSet(context.database.manager, params.page)
    return photoAnswer(context, set.photoKey, 'full', 'public')
  }),
  openRoute(endpoints.publicFile, async ({ params, context }) => {
    const { manager } = context.database
    const set = await publicSet(manager, params.page)
    const publication = await getPublication(manager, set.id, params.label)
    if (publication.recalledAt !== null)
      throw new Refusal(
        410,
        'recalled',
        `${publication.label} is recalled: ${publication.recallReason ?? ''}`,
        'Use the latest one.',
      )
    return sendFile(context, publication, params.file, 'public')
  }),
]
