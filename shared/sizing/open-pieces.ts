import type { PieceGiven } from '../pieces/given.ts'
import type { TemplateSet } from '../template/template-model.ts'

type Path = readonly (string | number)[]

/** A piece with sizes left open, and the keys that are. */
export interface OpenPiece {
  readonly name: string
  readonly keys: ReadonlySet<string>
}

/** Pieces with open sizes in the order of need: what goes in before what it goes into, the base before its lid. */
export function openPieces(set: TemplateSet, open: readonly Path[]): readonly OpenPiece[] {
  const keys = new Map<string, Set<string>>()
  for (const [group, piece, key] of open) {
    if (group !== 'pieces' || typeof piece !== 'string' || typeof key !== 'string') continue
    const known = keys.get(piece) ?? new Set<string>()
    known.add(key)
    keys.set(piece, known)
  }
  const needs = (name: string): readonly string[] => [
    ...set.fits.flatMap((fit) => {
      const put = fit.put.map((entry) => entry.piece)
      if (fit.relation === 'in') return fit.to === name ? [...put, ...(fit.holding === null ? [] : [fit.holding])] : []
      return put.includes(name) ? [fit.to] : []
    }),
    // What a band goes round may itself wait to be sized.
    ...aroundOf(set.pieces.get(name)),
  ]
  const ordered: string[] = []
  const visit = (name: string, above: ReadonlySet<string>): void => {
    if (ordered.includes(name) || above.has(name)) return
    for (const need of needs(name)) {
      // A flat thing that fills a box waits for the box, not the box for it.
      const isFiller =
        set.pieces.get(need)?.kind === 'divider' || (set.pieces.get(need)?.kind === 'insert' && keys.has(need))
      if (!isFiller) visit(need, new Set([...above, name]))
    }
    ordered.push(name)
  }
  for (const name of set.pieces.keys()) visit(name, new Set())
  return ordered.flatMap((name) => {
    const left = keys.get(name)
    return left === undefined ? [] : [{ name, keys: left }]
  })
}

const aroundOf = (piece: PieceGiven | undefined): readonly string[] =>
  piece !== undefined && (piece.kind === 'sleeve' || piece.kind === 'band') && piece.around !== null
    ? [piece.around]
    : []
