import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { setEndpoints } from '../../../shared/api/set-endpoints.ts'
import { dimensionOf } from '../../../shared/report/quantity.ts'
import type { Quantity } from '../../../shared/report/report.ts'
import { distributionOf } from '../../../shared/uncertainty/distribution.ts'
import type { LibraryPiece } from './library-piece.entity.ts'

type Hold = AnswerOf<(typeof setEndpoints)['holds']>['items'][number]

interface Thing {
  readonly length: number
  readonly width: number
  readonly height?: number | undefined
}

type Row = Pick<LibraryPiece, 'piece' | 'kind' | 'number' | 'inside'> & {
  readonly name: string
  readonly title: string
}

const mostShown = 100

/** Share of builds whose inside is at least as large as the thing, which is taken as it is. */
const shareOver = (inside: Quantity, size: number): number => 1 - distributionOf(dimensionOf(inside)).below(size)

function holdOf(row: Row, thing: Thing, isTurned: boolean): Hold {
  const { length, width, depth } = row.inside
  const [along, across] = isTurned ? [thing.width, thing.length] : [thing.length, thing.width]
  const hasDepth = depth !== undefined && thing.height !== undefined
  const goesIn = Math.min(
    shareOver(length, along),
    shareOver(width, across),
    hasDepth ? shareOver(depth, thing.height) : 1,
  )
  return {
    set: row.name,
    title: row.title,
    piece: row.piece,
    kind: row.kind,
    number: row.number,
    inside: { length: length.nominal, width: width.nominal, depth: depth?.nominal ?? null },
    isTurned,
    goesIn,
    clearance: {
      length: length.nominal - along,
      width: width.nominal - across,
      depth: hasDepth ? depth.nominal - thing.height : null,
    },
  }
}

/** Pieces of the library that a thing goes into in some builds at least: the surest first, then the closest. */
export async function findHolds(manager: EntityManager, teamId: string, thing: Thing): Promise<Hold[]> {
  const rows: Row[] = await manager.query(
    `select s.name, s.title, l.piece, l.kind, l.number, l.inside from library_piece l
     join template_set s on s.id = l.set_id
     where l.team_id = $1 and l.longer >= $2 and l.shorter >= $3
     order by l.longer * l.shorter limit 500`,
    [teamId, Math.max(thing.length, thing.width), Math.min(thing.length, thing.width)],
  )
  const room = ({ clearance }: Hold): number => clearance.length + clearance.width + Math.max(0, clearance.depth ?? 0)
  return rows
    .map((row) => {
      const straight = holdOf(row, thing, false)
      const turned = holdOf(row, thing, true)
      return turned.goesIn > straight.goesIn ? turned : straight
    })
    .filter(({ goesIn }) => goesIn > 0.005)
    .toSorted((a, b) => Math.round(b.goesIn * 100) - Math.round(a.goesIn * 100) || room(a) - room(b))
    .slice(0, mostShown)
}
