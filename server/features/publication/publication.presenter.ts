import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { Version } from '../versions/version.entity.ts'
import { Erratum } from './erratum.entity.ts'
import { PublishedFile } from './published-file.entity.ts'
import type { Publication } from './publication.entity.ts'

type Answers = typeof publicationEndpoints
type PublicationAnswer = AnswerOf<Answers['publish']>

export const presentErratum = (erratum: Erratum): AnswerOf<Answers['addErratum']> => ({
  id: erratum.id,
  labels: erratum.labels,
  pieces: erratum.pieces,
  pages: erratum.pages,
  symptom: erratum.symptom,
  wrong: erratum.wrong,
  right: erratum.right,
  severity: erratum.severity,
  workaround: erratum.workaround,
  oldPiecesMate: erratum.oldPiecesMate,
  mating: erratum.mating,
  thanks: erratum.thanks,
  reportedAt: erratum.createdAt.toISOString(),
  by: erratum.writtenBy,
})

/** Files of a publication with the path each is fetched at. */
export async function filesOf(
  manager: EntityManager,
  publication: Publication,
  pathOf: (name: string) => string,
): Promise<PublicationAnswer['files']> {
  const files = await manager.find(PublishedFile, { where: { publicationId: publication.id }, order: { name: 'ASC' } })
  return files.map(({ name, type, bytes }) => ({ name, type, bytes, path: pathOf(name) }))
}

export const errataOf = async (manager: EntityManager, setId: string, label: string): Promise<Erratum[]> => {
  const all = await manager.find(Erratum, { where: { setId }, order: { createdAt: 'DESC' }, take: 200 })
  return all.filter(({ labels }) => labels.includes(label))
}

export async function presentPublication(
  manager: EntityManager,
  team: string,
  set: TemplateSet,
  publication: Publication,
): Promise<PublicationAnswer> {
  const version = await manager.findOneBy(Version, { id: publication.versionId })
  const { label, recalledAt } = publication
  const base = `/api/teams/${team}/sets/${encodeURIComponent(set.name)}/publications/${label}/files/`
  return {
    label,
    version: publication.number,
    digest: version?.digest ?? '',
    publishedAt: publication.publishedAt.toISOString(),
    publishedBy: publication.publishedBy,
    notes: publication.notes,
    licence: publication.licence,
    exports: publication.exports,
    files: await filesOf(manager, publication, (name) => `${base}${encodeURIComponent(name)}`),
    recalled:
      recalledAt === null
        ? null
        : { reason: publication.recallReason ?? '', at: recalledAt.toISOString(), by: publication.recalledBy ?? '' },
    errata: (await errataOf(manager, set.id, label)).map(presentErratum),
  }
}
