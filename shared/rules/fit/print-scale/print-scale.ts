import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import { judgeSet, type JudgedSet } from '../../../assembly/judge-set.ts'
import { feelsScale, scaleWindow } from '../../../assembly/scale-window.ts'
import { modelDefaults } from '../../../pieces/model-defaults.ts'
import type { PieceGiven } from '../../../pieces/given.ts'
import { oncePerSet } from '../../once-per-set.ts'
import type { Finding, Rule } from '../../rule.ts'
import { fitInWords } from '../../wording.ts'

const isMeasured = (piece: PieceGiven | undefined): boolean => piece?.stock != null && piece.made === 'measured'

/** The set as it comes out when makers trace every measured piece from a printed page instead. */
const traced = oncePerSet((judged): ReadonlyMap<string, JudgedFit> => {
  const pieces = new Map(
    [...judged.set.pieces].map(([name, piece]) => [
      name,
      isMeasured(piece) ? { ...piece, made: 'printed' as const } : piece,
    ]),
  )
  const again = judgeSet({ ...judged.set, pieces }, { ...judged.options, fixes: false, scales: false })
  return new Map(again.fits.map((fit) => [fit.fit.id, fit]))
})

const percent = (scale: number): string => `${String(Number((scale * 100).toFixed(1)))} %`

function judgeWindow(judged: JudgedSet, fit: JudgedFit): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const window = scaleWindow(judged, fit)
  const thing = fitInWords(fit)
  if (window === null)
    return {
      severity: 'info',
      measure: null,
      message: `${thing} fails at the print scale it was judged at, so no scale is named.`,
    }
  const limit = modelDefaults.printerHalfWidth.value
  const actual = Math.min(1 - window.min, window.max - 1)
  const isWide = actual >= limit
  const span = `${percent(window.min)} to ${percent(window.max)}`
  return {
    severity: isWide ? 'pass' : 'info',
    measure: { actual, limit, sense: 'at-least', unit: 'share' },
    message: isWide
      ? `${thing} holds where printed pages come out at ${span}.`
      : `${thing} holds only where printed pages come out at ${span}, less room than a printer takes by itself (${percent(limit)} either way). Ask makers to measure the bars, or leave more clearance.`,
  }
}

function judgeTraced(judged: JudgedSet, fit: JudgedFit): Pick<Finding, 'severity' | 'measure' | 'message'> {
  const printed = traced(judged).get(fit.fit.id)
  const thing = fitInWords(fit)
  const isWorse = printed?.verdict === 'fail' && fit.verdict !== 'fail'
  return {
    severity: isWorse ? 'info' : 'pass',
    measure:
      printed === undefined
        ? null
        : { actual: printed.closes, limit: judged.set.tokens.floor, sense: 'at-least', unit: 'share' },
    message: isWorse
      ? `${thing} fails for makers who trace its pieces from a printed page instead of measuring them, for the printer stretches what it prints.`
      : `${thing} holds for makers who trace its pieces from a page printed true to size.`,
  }
}

function judgePrinted(judged: JudgedSet, fit: JudgedFit): readonly Finding[] {
  const common = { subject: fit.fit.id, path: ['fits', fit.fit.id] }
  if (feelsScale(fit)) return [{ ...common, ...judgeWindow(judged, fit) }]
  const names = [...fit.fit.put.map((entry) => entry.piece), fit.fit.to]
  return names.some((name) => isMeasured(judged.set.pieces.get(name)))
    ? [{ ...common, ...judgeTraced(judged, fit) }]
    : []
}

export const printScaleRule: Rule = {
  id: 'fit/print-scale',
  level: 'info',
  title: 'Printed pieces fit at the scale printers keep',
  why: 'Pieces printed together shrink together; a piece for something bought does not. Makers need to know between which scales the fit holds.',
  origin: {
    kind: 'derived',
    source:
      'Blanks scale with the page; calipers, measured and bought pieces do not. How far a printer stretches is a guess.',
  },
  remedy: 'Print at 100 % and measure the bars on every page; where the window is narrow, leave more clearance.',
  // Windows and a second judging take time, so they are worked out where they are asked for.
  judge: (judged) => (judged.options.scales === true ? judged.fits.flatMap((fit) => judgePrinted(judged, fit)) : []),
}
