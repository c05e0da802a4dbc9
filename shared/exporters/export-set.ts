import { judgeSet, type JudgedSet } from '../assembly/judge-set.ts'
import { feelsScale, scaleWindow } from '../assembly/scale-window.ts'
import type { PrintWindow } from '../drawing/scale-bar.ts'
import type { Blank } from '../pieces/blank.ts'
import { drawPiece } from '../pieces/draw-registry.ts'
import type { FoldedPiece } from '../pieces/folded-piece.ts'
import type { Report } from '../report/report.ts'
import type { Fit, Stock, TemplateSet } from '../template/template-model.ts'
import type { Millimetres, Ruler, RulerUnit } from '../units/units.ts'

/** One flat sheet with how many of it the set needs. */
export interface ExportSheet {
  readonly piece: string
  readonly blank: Blank
  readonly copies: number
}

export interface ExportPiece {
  readonly name: string
  readonly folded: FoldedPiece
  readonly sheets: readonly ExportSheet[]
  readonly make: number
}

/** A lid's cut size goes by what its base measures. */
export interface LidPair {
  readonly base: string
  readonly lid: string
}

/** A checked set as exporters take it: pieces with their sheets, and what goes on every page. */
export interface ExportSet {
  readonly name: string
  readonly title: string
  readonly family: { readonly name: string; readonly title: string; readonly mark: string | null } | null
  readonly units: RulerUnit
  readonly ruler: Ruler
  /** Short form of the report's digest. */
  readonly digest: string
  readonly asOf: string
  readonly engine: string
  /** `version 3`, or words for a set that was never pushed. */
  readonly version: string
  readonly window: PrintWindow | null
  /** The failing fit or rule in a few words; `null` for a set that passes. */
  readonly draft: string | null
  readonly pieces: readonly ExportPiece[]
  readonly fits: readonly Fit[]
  readonly lids: readonly LidPair[]
  readonly steps: TemplateSet['steps']
  readonly stocks: ReadonlyMap<string, Stock>
  readonly sheet: TemplateSet['sheet']
}

const sameOutline = (a: Blank, b: Blank): boolean =>
  a.stock === b.stock &&
  a.outline.length === b.outline.length &&
  a.outline.every((point, index) => {
    const other = b.outline[index]
    return other !== undefined && Math.abs(point.x - other.x) < 1e-9 && Math.abs(point.y - other.y) < 1e-9
  })

/** Sheets of one piece, equal ones counted instead of repeated. */
function sheetsOf(piece: string, blanks: readonly Blank[], make: number): readonly ExportSheet[] {
  const found: ExportSheet[] = []
  for (const blank of blanks) {
    const index = found.findIndex((sheet) => sameOutline(sheet.blank, blank))
    const twin = found[index]
    if (twin === undefined) found.push({ piece, blank, copies: make })
    else found[index] = { ...twin, copies: twin.copies + make }
  }
  return found.map((sheet) =>
    sheet.copies > make ? { ...sheet, blank: { ...sheet.blank, name: sheet.blank.name.replace(/ \d+$/, '') } } : sheet,
  )
}

/**
 * Print scales at which every fit holds for makers who trace these pages: each measured piece then comes out as a
 * printed one. `null` where some fit holds at no scale, so that tracing would not do.
 */
function windowOf(judged: JudgedSet): PrintWindow | null {
  const pieces = new Map(
    [...judged.set.pieces].map(([name, piece]) => [
      name,
      piece.stock === null ? piece : { ...piece, made: 'printed' as const },
    ]),
  )
  const traced = judgeSet({ ...judged.set, pieces }, { ...judged.options, scale: 1, fixes: false, scales: false })
  const windows = traced.fits.filter(feelsScale).map((fit) => scaleWindow(traced, fit))
  if (windows.some((window) => window === null)) return null
  return {
    min: Math.max(0.9, ...windows.map((window) => window?.min ?? 0.9)),
    max: Math.min(1.1, ...windows.map((window) => window?.max ?? 1.1)),
  }
}

/** What fails, in a few words for the stamp. */
function draftOf(report: Report): string | null {
  if (report.summary.verdict !== 'fail' && report.summary.verdict !== 'invalid') return null
  const failing = report.verdicts.find((verdict) => verdict.status === 'fail')
  return failing === undefined ? 'this set does not pass its check' : `${failing.subject} fails (${failing.rule})`
}

/** Gathers what exporters need of a judged set. @param version words for the pages, such as `version 3` */
export function exportSet(judged: JudgedSet, report: Report, version: string): ExportSet {
  const { set } = judged
  const grainOf = (stock: string): 'long' | 'short' | null => set.tokens.stocks.get(stock)?.grain ?? null
  const pieces = [...judged.pieces].map(([name, folded]): ExportPiece => {
    const make = judged.makes.get(name) ?? 1
    return { name, folded, make, sheets: sheetsOf(name, drawPiece(name, folded, grainOf), make) }
  })
  const lids = set.fits.flatMap((fit): LidPair[] => {
    const lid = fit.relation === 'over' ? fit.put[0]?.piece : undefined
    return lid === undefined || judged.pieces.get(lid)?.form.kind !== 'box' ? [] : [{ base: fit.to, lid }]
  })
  return {
    name: set.name,
    title: set.title,
    family: set.family === null ? null : { name: set.family, title: set.family, mark: null },
    units: set.tokens.units,
    ruler: set.tokens.ruler,
    digest: report.digest.replace(/^sha256:/, '').slice(0, 12),
    asOf: report.asOf,
    engine: report.engine,
    version,
    window: windowOf(judged),
    draft: draftOf(report),
    pieces,
    fits: set.fits,
    lids,
    steps: set.steps,
    stocks: set.tokens.stocks,
    sheet: set.sheet,
  }
}

/** The name people know a paper by. */
export const stockTitle = (set: ExportSet, name: string): string => set.stocks.get(name)?.title ?? name

/** The sheet a paper is bought in, else the set's own. */
export const boughtSheet = (
  set: ExportSet,
  stock: string,
): { readonly name: string; readonly length: Millimetres; readonly width: Millimetres } =>
  set.stocks.get(stock)?.sheet ?? set.sheet
