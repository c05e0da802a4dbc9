import type { EntityManager } from 'typeorm'
import type { Report } from '../../../shared/report/report.ts'
import type { TemplateSet } from './template-set.entity.ts'
import { LibraryPiece } from './library-piece.entity.ts'

/** Writes anew which pieces of a set can hold something, from the version that is shown. */
export async function refreshLibrary(
  manager: EntityManager,
  set: TemplateSet,
  number: number,
  report: Report,
): Promise<void> {
  await manager.delete(LibraryPiece, { setId: set.id })
  const rows = Object.entries(report.pieces).flatMap(([piece, { inside, kind }]) =>
    inside === null
      ? []
      : [
          {
            setId: set.id,
            piece,
            teamId: set.teamId,
            number,
            kind,
            longer: Math.max(inside.length.max, inside.width.max),
            shorter: Math.min(inside.length.max, inside.width.max),
            inside: JSON.parse(
              JSON.stringify({
                length: inside.length,
                width: inside.width,
                ...(inside.depth === undefined ? {} : { depth: inside.depth }),
              }),
            ) as never,
          },
        ],
  )
  if (rows.length > 0) await manager.insert(LibraryPiece, rows)
}
