import type { JudgedSet } from '../assembly/judge-set.ts'
import { areaOf } from '../geometry/area.ts'
import type { Blank } from '../pieces/blank.ts'
import { drawnBlanks } from './drawn-blanks.ts'

const squareMillimetresPerSquareMetre = 1e6

function blankWeight(judged: JudgedSet, blank: Blank): number | null {
  const name = judged.options.paper ?? blank.stock
  const grammage = name === null ? null : (judged.set.tokens.stocks.get(name)?.grammage ?? null)
  if (grammage === null) return null
  const area = blank.holes.reduce((left, hole) => left - areaOf(hole), areaOf(blank.outline))
  return (area * grammage) / squareMillimetresPerSquareMetre
}

/**
 * Weight of the paper in one piece: area of its sheets times their grammage (derived).
 * @returns grams; `null` where a grammage is not known or the piece is bought
 */
export function paperWeight(judged: JudgedSet, piece: string): number | null {
  const blanks = drawnBlanks(judged).get(piece) ?? []
  if (blanks.length === 0) return null
  let total = 0
  for (const blank of blanks) {
    const weight = blankWeight(judged, blank)
    if (weight === null) return null
    total += weight
  }
  return total
}
