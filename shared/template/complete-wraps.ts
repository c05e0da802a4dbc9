import type { BandGiven } from '../pieces/band/band-given.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { ReportProblem } from '../pieces/reading/report-problem.ts'
import type { SleeveGiven } from '../pieces/sleeve/sleeve-given.ts'
import type { Fit } from './template-model.ts'

type Wrap = BandGiven | SleeveGiven

const isWrap = (piece: PieceGiven): piece is Wrap => piece.kind === 'band' || piece.kind === 'sleeve'

/** What a fit says a band or sleeve goes round, where the piece does not say it. */
const wrappedBy = (name: string, fits: readonly Fit[]): string | null =>
  fits.find((fit) => fit.relation === 'around' && fit.put.some(({ piece }) => piece === name))?.to ?? null

/** Takes from the fits what bands and sleeves go round; one whose blank cannot be reckoned for want of it is reported. */
export function completeWraps(
  pieces: ReadonlyMap<string, PieceGiven>,
  fits: readonly Fit[],
  report: ReportProblem,
): ReadonlyMap<string, PieceGiven> {
  const completed = new Map<string, PieceGiven>()
  for (const [name, piece] of pieces) {
    if (!isWrap(piece) || piece.around !== null) {
      completed.set(name, piece)
      continue
    }
    const around = wrappedBy(name, fits)
    if (around === null && (piece.blank === null || piece.blank === 'fit')) {
      report(
        ['pieces', name],
        'missing-key',
        `Nothing says what “${name}” goes round, and it has no blank.`,
        'Write “around” with the name of a piece, or its “blank”.',
        'key',
      )
    }
    completed.set(name, { ...piece, around })
  }
  return completed
}
