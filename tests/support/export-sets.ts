import { boundsOf } from '../../shared/geometry/bounds.ts'
import { pageSizes, type PageSize } from '../../shared/drawing/page-size.ts'
import type { ExportSet } from '../../shared/exporters/export-set.ts'
import type { DocumentOptions } from '../../shared/exporters/template-document.ts'
import { drawPiece } from '../../shared/pieces/draw-registry.ts'
import type { PieceGiven } from '../../shared/pieces/given.ts'
import { foldGiven } from './given-pieces.ts'

export const pageNamed = (name: string): PageSize => {
  const size = pageSizes[name]
  if (size === undefined) throw new Error(`no page called ${name}`)
  return size
}

/** A checked set of pieces as exporters take it, without going through text. */
export function anExportSet(pieces: readonly PieceGiven[], more: Partial<ExportSet> = {}): ExportSet {
  return {
    name: 'orchard-notes',
    title: 'Orchard notes, six cards in a box',
    family: null,
    units: 'mm',
    ruler: { cut: 1, score: 1 },
    digest: '0123456789ab',
    asOf: '2026-12-01',
    engine: '1.0.0',
    version: 'not published',
    window: { min: 0.985, max: 1.012 },
    draft: null,
    pieces: pieces.map((given) => {
      const folded = foldGiven(given)
      const blanks = drawPiece(given.name, folded)
      return {
        name: given.name,
        folded,
        make: 1,
        sheets: blanks.map((blank) => ({ piece: given.name, blank, copies: 1 })),
      }
    }),
    fits: [],
    lids: [],
    steps: 'auto',
    stocks: new Map(),
    sheet: { name: '420 x 297', length: 420, width: 297 },
    ...more,
  }
}

export const documentOptions = (more: Partial<DocumentOptions> = {}): DocumentOptions => ({
  size: pageNamed('a4'),
  margin: 5,
  isTiled: false,
  isLargePrint: false,
  pieces: null,
  ...more,
})

/** Width and height of a sheet as drawn. */
export function spanOf(outline: readonly { readonly x: number; readonly y: number }[]): readonly [number, number] {
  const { left, bottom, right, top } = boundsOf(outline)
  return [right - left, top - bottom]
}
