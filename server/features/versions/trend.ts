import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { versionEndpoints } from '../../../shared/api/version-endpoints.ts'
import type { FitReport } from '../../../shared/report/report.ts'

type Point = AnswerOf<(typeof versionEndpoints)['trend']>['items'][number]

/** Clearance and yield of every axis of every fit over the last versions of a branch, oldest first. */
export async function trendOf(
  manager: EntityManager,
  setId: string,
  branch: string,
  versions: number,
): Promise<Point[]> {
  const rows: { number: number; at: Date; fits: readonly FitReport[] }[] = await manager.query(
    `select recent.number, recent.created_at as at, c.report -> 'fits' as fits
     from (select id, number, created_at from version where set_id = $1 and branch = $2 order by number desc limit $3) recent
     join version_content c on c.version_id = recent.id order by recent.number`,
    [setId, branch, versions],
  )
  return rows.flatMap(({ number, at, fits }) =>
    fits.flatMap((fit) =>
      fit.axes.map(({ axis, clearance: { nominal, min, max }, required, binds, rattles }) => ({
        number,
        pushedAt: at.toISOString(),
        fit: fit.id,
        axis,
        clearance: { nominal, min, max },
        required: { min: required.min, max: required.max },
        binds,
        rattles,
      })),
    ),
  )
}
