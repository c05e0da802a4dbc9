import { formatMark } from '../../../shared/units/format-length.ts'
import type { PieceReport, Report } from '../../../shared/report/report.ts'

/** A measure that will be published. */
export interface Measure {
  readonly key: string
  readonly piece: string | null
  readonly fit: string | null
  readonly what: string
  /** Millimetres. */
  readonly value: number
  readonly from: string
  readonly sum: readonly string[]
  readonly line: number | null
}

interface Mark {
  readonly what: string
  readonly nominal: number
  readonly grid: 'cut' | 'score'
}

const marksOf = (piece: PieceReport): readonly Mark[] =>
  Array.isArray(piece['measures']) ? (piece['measures'] as readonly Mark[]) : []

const isSize = (value: unknown): value is { readonly length: number; readonly width: number } =>
  typeof value === 'object' && value !== null && 'length' in value && typeof value.length === 'number'

const asKey = (words: string): string => words.toLowerCase().replace(/[^a-z0-9]+/g, '-')

/** Line of the first verdict about a piece or fit: where an editor finds it in the source. */
function lineOf(report: Report, name: string): number | null {
  const verdict = report.verdicts.find(
    ({ subject, at }) => at.path[1] === name || subject === name || subject.startsWith(`${name}:`),
  )
  return verdict?.at.line ?? null
}

function measuresOfPiece(report: Report, name: string, piece: PieceReport): readonly Measure[] {
  const line = lineOf(report, name)
  const of = (what: string, value: number, from: string, sum: readonly string[] = []): Measure => ({
    key: `${name}/${asKey(what)}`,
    piece: name,
    fit: null,
    what: `${name} ${what}`,
    value,
    from,
    sum: sum.map((part) => `${name}/${asKey(part)}`),
    line,
  })
  const marks = marksOf(piece)
  const has = (what: string): boolean => marks.some((mark) => mark.what === what)
  const written = marks.map((mark) =>
    of(mark.what, mark.nominal, mark.grid === 'cut' ? 'a mark to cut at' : 'a mark to score at'),
  )
  const { scored } = piece
  if (!isSize(scored)) return written
  const walls = has('wall') ? ['wall'] : []
  return [
    ...written,
    of('scored length', scored.length, 'blank length less the walls at both ends', ['blank length', ...walls]),
    of('scored width', scored.width, 'blank width less the walls at both sides', ['blank width', ...walls]),
  ]
}

const measuresOfFits = (report: Report): readonly Measure[] =>
  report.fits.flatMap((fit) =>
    fit.axes.map((axis) => ({
      key: `${fit.id}/clearance-${axis.axis}`,
      piece: null,
      fit: fit.id,
      what: `${fit.id} clearance, ${axis.axis}`,
      value: axis.clearance.nominal,
      from: 'the outer piece’s inside less the inner piece’s outside',
      sum: [],
      line: lineOf(report, fit.id),
    })),
  )

/** Every measure that is published with a set: what makers mark, what follows from it, and what fits leave. */
export const measuresOf = (report: Report): readonly Measure[] => [
  ...Object.entries(report.pieces).flatMap(([name, piece]) => measuresOfPiece(report, name, piece)),
  ...measuresOfFits(report),
]

/** Finest marks that makers of either unit are asked to find when a measure is shown: half a millimetre, a sixteenth. */
const grids = { mm: 0.5, in: 25.4 / 16 } as const

/** The measure as a maker finds it on a ruler of either unit. */
export const marksOn = (value: number): { readonly mm: string; readonly in: string } => ({
  mm: formatMark(value, grids.mm, 'mm').text,
  in: formatMark(value, grids.in, 'in').text,
})
