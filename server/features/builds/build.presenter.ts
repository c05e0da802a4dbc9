import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { Version } from '../versions/version.entity.ts'
import { BuildPhoto } from './build-photo.entity.ts'
import type { Build } from './build.entity.ts'

type BuildAnswer = AnswerOf<(typeof buildEndpoints)['saveBuild']>
type PhotoAnswer = BuildAnswer['photos'][number]

/** @param base path under which photographs are fetched by whoever is answered */
export const presentPhoto = (photo: BuildPhoto, base: string): PhotoAnswer => ({
  id: photo.id,
  alt: photo.alt,
  mayBePublished: photo.mayBePublished,
  width: photo.width,
  height: photo.height,
  path: `${base}${photo.id}`,
  thumbnail: `${base}${photo.id}?size=thumbnail`,
})

export async function presentBuild(manager: EntityManager, build: Build, base: string): Promise<BuildAnswer> {
  const version = await manager.findOneBy(Version, { id: build.versionId })
  const photos = await manager.find(BuildPhoto, { where: { buildId: build.id }, order: { createdAt: 'ASC' } })
  return {
    id: build.id,
    stamp: build.stamp,
    version: version?.number ?? 0,
    tester: build.tester,
    source: build.source,
    state: build.submittedAt === null ? 'draft' : 'submitted',
    report: build.report,
    photos: photos.map((photo) => presentPhoto(photo, base)),
    startedAt: build.startedAt.toISOString(),
    submittedAt: build.submittedAt?.toISOString() ?? null,
  }
}
