import type { PieceReport, Report } from '../../../shared/report/report.ts'

/** Pieces in the order of the text: a stored report has lost it. */
export function piecesInOrder(report: Report, text: string): readonly (readonly [name: string, piece: PieceReport])[] {
  const lines = text.split('\n')
  const place = (name: string): number => {
    const at = lines.findIndex(
      (line) => line.trimStart().replace(/^["']/, '').startsWith(`${name}:`) && /^[ {]/.test(line),
    )
    return at === -1 ? lines.length : at
  }
  return Object.entries(report.pieces)
    .map((entry) => ({ entry, at: place(entry[0]) }))
    .toSorted((a, b) => a.at - b.at)
    .map(({ entry }) => entry)
}
