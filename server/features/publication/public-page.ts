import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { found } from '../../http/refusal.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { Team } from '../teams/team.entity.ts'
import { textsOf } from '../versions/version.repository.ts'
import { compareLabels } from './labels.ts'
import { errataOf, filesOf, presentErratum } from './publication.presenter.ts'
import { Publication } from './publication.entity.ts'

/** The set behind a public page that is switched on. @throws Refusal 404 */
export const publicSet = async (manager: EntityManager, page: string): Promise<TemplateSet> =>
  found(await manager.findOneBy(TemplateSet, { publicKey: page, isPublic: true }), 'There is no page at this address.')

/** The publication of a label; without one the latest that is not recalled, else the latest. */
async function chooseFrom(manager: EntityManager, setId: string, label: string | undefined) {
  const all = (await manager.findBy(Publication, { setId })).toSorted((a, b) => compareLabels(b.label, a.label))
  const chosen =
    label === undefined
      ? (all.find(({ recalledAt }) => recalledAt === null) ?? all[0])
      : all.find((publication) => publication.label === label)
  return { all, publication: found(chosen, 'Nothing is published here yet.') }
}

/** What anybody may read about a published set: neither text nor people. */
export async function presentPublicPage(
  manager: EntityManager,
  page: string,
  asked: string | undefined,
): Promise<AnswerOf<(typeof publicationEndpoints)['publicPage']>> {
  const set = await publicSet(manager, page)
  const team = found(await manager.findOneBy(Team, { id: set.teamId }))
  const { all, publication } = await chooseFrom(manager, set.id, asked)
  const { report } = (await textsOf(manager, publication.versionId)).content
  const { label, recalledAt } = publication
  return {
    title: report.title,
    team: team.name,
    label,
    publishedAt: publication.publishedAt.toISOString(),
    digest: report.digest,
    units: report.units,
    works: report.summary.works,
    workmanship: report.workmanship,
    pieces: Object.entries(report.pieces).map(([name, { kind, stock, blank, make }]) => ({
      name,
      kind,
      stock,
      blank: blank === null ? null : { length: blank.length, width: blank.width },
      make,
    })),
    fits: report.fits.map(({ id, closes, verdict }) => ({ id, closes, verdict })),
    notes: publication.notes,
    licence: publication.licence,
    files:
      recalledAt === null
        ? await filesOf(manager, publication, (name) => `/api/public/${page}/${label}/${encodeURIComponent(name)}`)
        : [],
    errata: (await errataOf(manager, set.id, label)).map(presentErratum),
    recalled: recalledAt === null ? null : { reason: publication.recallReason ?? '', at: recalledAt.toISOString() },
    photo: set.photoKey === null ? null : `/api/public/${page}/photo`,
    others: all
      .filter(({ id }) => id !== publication.id)
      .map((other) => ({ label: other.label, isRecalled: other.recalledAt !== null })),
  }
}
