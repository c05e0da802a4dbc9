import type { EntityManager } from 'typeorm'
import { Publication } from '../publication/publication.entity.ts'
import { Version } from './version.entity.ts'

/** The version that was published last and is not recalled. */
export const publishedVersionOf = (manager: EntityManager, setId: string): Promise<Version | null> =>
  manager
    .createQueryBuilder(Version, 'v')
    .innerJoin(Publication, 'p', 'p.versionId = v.id')
    .where('p.setId = :setId and p.recalledAt is null', { setId })
    .orderBy('p.publishedAt', 'DESC')
    .limit(1)
    .getOne()
