import type { EntityManager } from 'typeorm'
import type { ReviewState } from './version.entity.ts'
import { SourceText } from './source-text.entity.ts'
import { TemplateSet } from '../sets/template-set.entity.ts'
import { Publication } from '../publication/publication.entity.ts'
import { found } from '../../http/refusal.ts'
import { VersionContent } from './version-content.entity.ts'
import { Version } from './version.entity.ts'

export const findSet = (manager: EntityManager, teamId: string, name: string): Promise<TemplateSet | null> =>
  manager.findOneBy(TemplateSet, { teamId, name })

/** A version by its number. Without a limit, for that would tempt the planner to read until it meets one. */
export const findVersion = async (manager: EntityManager, setId: string, number: number): Promise<Version | null> =>
  (await manager.findBy(Version, { setId, number }))[0] ?? null

/** A set and one of its versions. @throws Refusal 404 */
export async function getVersion(
  manager: EntityManager,
  teamId: string,
  setName: string,
  number: number,
): Promise<{ readonly set: TemplateSet; readonly version: Version }> {
  const set = found(await findSet(manager, teamId, setName))
  return {
    set,
    version: found(await findVersion(manager, set.id, number), `${setName} has no version ${String(number)}.`),
  }
}

export interface VersionTexts {
  readonly content: VersionContent
  readonly text: string
  readonly workspace: { readonly file: string; readonly text: string } | null
}

/** Texts and report of a version. */
export async function textsOf(manager: EntityManager, versionId: string): Promise<VersionTexts> {
  const content = found(await manager.findOneBy(VersionContent, { versionId }))
  const { teamId, textDigest, workspaceDigest, workspaceFile } = content
  const text = found(await manager.findOneBy(SourceText, { teamId, digest: textDigest })).text
  const tokens =
    workspaceDigest === null ? null : await manager.findOneBy(SourceText, { teamId, digest: workspaceDigest })
  return {
    content,
    text,
    workspace: tokens === null ? null : { file: workspaceFile ?? 'foldgauge.yaml', text: tokens.text },
  }
}

/** Versions of a set below a number, newest first, each filter on an index of its own. */
export function listVersions(
  manager: EntityManager,
  setId: string,
  filter: {
    readonly branch?: string | undefined
    readonly review?: ReviewState | undefined
    readonly below: number | null
  },
  limit: number,
): Promise<Version[]> {
  const query = manager
    .createQueryBuilder(Version, 'v')
    .where('v.setId = :setId', { setId })
    .orderBy('v.number', 'DESC')
    .limit(limit)
  if (filter.below !== null) query.andWhere('v.number < :below', { below: filter.below })
  if (filter.branch !== undefined) query.andWhere('v.branch = :branch', { branch: filter.branch })
  if (filter.review !== undefined) query.andWhere('v.reviewState = :review', { review: filter.review })
  return query.getMany()
}

/** What rows of a list need besides the versions: labels, and which are compared with or pinned. */
export interface VersionCompany {
  readonly publications: ReadonlyMap<string, Publication>
  readonly locked: ReadonlySet<string>
}

export async function companyOf(manager: EntityManager, versions: readonly Version[]): Promise<VersionCompany> {
  if (versions.length === 0) return { publications: new Map(), locked: new Set() }
  const ids = versions.map(({ id }) => id)
  const publications = await manager
    .createQueryBuilder(Publication, 'p')
    .where('p.versionId = any(:ids)', { ids })
    .getMany()
  const locked: { id: string }[] = await manager.query(
    `select distinct baseline_id as id from version where baseline_id = any($1::uuid[])
     union select pinned_version_id from template_set where id = any($2::uuid[]) and pinned_version_id is not null`,
    [ids, [...new Set(versions.map(({ setId }) => setId))]],
  )
  return {
    publications: new Map(publications.map((publication) => [publication.versionId, publication])),
    locked: new Set(locked.map(({ id }) => id)),
  }
}
