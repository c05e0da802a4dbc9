import type { FoldedPiece } from '../pieces/folded-piece.ts'
import { quantityOf } from '../report/quantity.ts'
import type { PieceReport } from '../report/report.ts'
import { stackHeight } from './loads.ts'
import type { JudgedSet } from './judge-set.ts'

/** What a report says of a kind beyond the sizes every piece has. */
function detailsOf(piece: FoldedPiece): Record<string, unknown> {
  const { form, given } = piece
  switch (form.kind) {
    case 'card':
      return {
        closed: { length: quantityOf(piece.outside.length), width: quantityOf(piece.outside.width) },
        thickness: quantityOf(stackHeight(piece)),
        panels: form.panels,
        layers: form.layers,
        raised: piece.raised === null ? null : { height: quantityOf(piece.raised.height), rim: piece.raised.rim },
      }
    case 'envelope': {
      const common = {
        style: form.style,
        pocket: form.pocket,
        throatAlong: form.throatAlong,
        layers: form.layers,
        thickness: quantityOf(piece.outside.height),
      }
      if (form.style === 'square-flap') return { ...common, back: form.back, sideFlap: form.sideFlap, flap: form.flap }
      const { left, right, bottom, flap } = form.corners
      return {
        ...common,
        square: form.square,
        corners: { sides: [left, right], bottom, flap },
        seam: form.seam,
        reach: {
          side: form.reach.left,
          left: form.reach.left,
          right: form.reach.right,
          bottom: form.reach.bottom,
          top: form.reach.top,
        },
      }
    }
    case 'box':
      return { walls: form.walls, scored: form.scored, tabbed: form.tabbedAxis }
    case 'sleeve':
      return { panels: form.panels, overlap: quantityOf(form.overlap), wrapped: form.wrapped }
    case 'band':
      return { strip: quantityOf(form.stripLength), wrapped: form.wrapped, ribbon: form.ribbon }
    case 'bag':
      return { panels: form.panels, top: form.top, bottom: form.bottom, seam: form.seam }
    case 'insert':
      return { standing: form.standing }
    case 'bought':
      return { body: form.body }
    case 'custom':
      return { declared: given.kind === 'custom' && (given.inside !== null || given.outside !== null) }
  }
}

function reportPiece(judged: JudgedSet, name: string, piece: FoldedPiece): PieceReport {
  const { given, cavity, outside } = piece
  return {
    kind: given.kind,
    stock: given.stock,
    caliper: piece.caliper?.nominal ?? null,
    blank: piece.blank,
    inside:
      cavity === null
        ? null
        : {
            length: quantityOf(cavity.length),
            width: quantityOf(cavity.width),
            ...(cavity.depth === null ? {} : { depth: quantityOf(cavity.depth) }),
          },
    outside: {
      length: quantityOf(outside.length),
      width: quantityOf(outside.width),
      height: quantityOf(outside.height),
    },
    make: judged.makes.get(name) ?? 1,
    made: given.made,
    measures: piece.measures.map(({ what, nominal, grid }) => ({ what, nominal, grid })),
    ...detailsOf(piece),
  }
}

/** Every piece of a set as reported, in the order of the file. */
export function reportPieces(judged: JudgedSet): Readonly<Record<string, PieceReport>> {
  return Object.fromEntries([...judged.pieces].map(([name, piece]) => [name, reportPiece(judged, name, piece)]))
}
