import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { FoldedPiece, Measure } from '../../../pieces/folded-piece.ts'
import { ceilToGrid, floorToGrid, isOnGrid, roundToGrid } from '../../../units/grid.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, listInWords } from '../../wording.ts'

interface Off {
  readonly measure: Measure
  readonly by: number
}

/** `side corners 91.2 mm (take 91 mm or 92 mm)` */
function offInWords(judged: JudgedSet, { measure }: Off): string {
  const grid = judged.set.tokens.ruler[measure.grid]
  const low = floorToGrid(measure.nominal, grid)
  const high = inSetUnits(judged, ceilToGrid(measure.nominal, grid))
  const marks = low > 0 ? `${inSetUnits(judged, low)} or ${high}` : high
  return `${measure.what} ${inSetUnits(judged, measure.nominal)} (take ${marks})`
}

function judgePiece(judged: JudgedSet, name: string, piece: FoldedPiece): readonly Finding[] {
  if (piece.given.made !== 'measured' || piece.measures.length === 0) return []
  const { ruler } = judged.set.tokens
  const off = piece.measures
    .filter((measure) => !isOnGrid(measure.nominal, ruler[measure.grid]))
    .map((measure) => ({ measure, by: Math.abs(measure.nominal - roundToGrid(measure.nominal, ruler[measure.grid])) }))
    .toSorted((a, b) => b.by - a.by)
  const marks =
    Math.abs(ruler.cut - ruler.score) < 1e-9
      ? `marks of ${inSetUnits(judged, ruler.cut)}`
      : `marks of ${inSetUnits(judged, ruler.cut)} for cutting and ${inSetUnits(judged, ruler.score)} for scoring`
  const worst = off.map((each) => offInWords(judged, each))
  const count = `${String(off.length)} of ${String(piece.measures.length)} measures`
  return [
    {
      subject: name,
      severity: off.length === 0 ? 'pass' : 'warn',
      measure: { actual: off[0]?.by ?? 0, limit: 0, sense: 'at-most', unit: 'mm' },
      message:
        off.length === 0
          ? `Every measure of ${name} is on ${marks}.`
          : `${name} is measured, but ${off.length === 1 ? '1 measure lies' : `${count} lie`} between ${marks}: ${listInWords(worst, 3)}. Move them to a mark, or let makers trace it (made: printed).`,
      path: ['pieces', name],
    },
  ]
}

export const offGridRule: Rule = {
  id: 'ruler/off-grid',
  level: 'warn',
  title: 'Every measure is a mark on the ruler',
  why: 'Makers cannot find 91.2 mm on a ruler; they take the nearest mark, each of them another one, and the fit is no longer the one that was checked.',
  origin: {
    kind: 'published',
    source: 'Makers complain of converted measures they cannot set on a trimmer; which marks count is set by `ruler`.',
  },
  remedy: 'Move the measure to the nearest mark either way and check again, or publish the piece as printed.',
  judge: (judged) => [...judged.pieces].flatMap(([name, piece]) => judgePiece(judged, name, piece)),
}
