import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { FoldedPiece } from '../../../pieces/folded-piece.ts'
import { drawnBlanks } from '../../drawn-blanks.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'

/** Whether paper of this piece is bent at all: everything but what stays flat, what is bought and a ribbon. */
function isBent({ form, isFolded }: FoldedPiece): boolean {
  switch (form.kind) {
    case 'bought':
    case 'insert':
      return false
    case 'band':
      return !form.ribbon
    case 'card':
      return isFolded
    case 'custom':
      return isFolded
    case 'envelope':
    case 'box':
    case 'sleeve':
    case 'bag':
      return true
  }
}

/** A declared height or room with no line to fold makes a custom piece one that is bent without a score. */
function isShaped({ given }: FoldedPiece): boolean {
  return given.kind === 'custom' && (given.outside?.height != null || given.inside?.depth != null)
}

function judgePiece(judged: JudgedSet, name: string, piece: FoldedPiece): readonly Finding[] {
  if (!isBent(piece) && !isShaped(piece)) return []
  const stock = piece.given.stock === null ? undefined : judged.set.tokens.stocks.get(piece.given.stock)
  if (stock === undefined) return []
  const common = { subject: name, path: ['pieces', name] }
  const { grammage } = stock
  if (grammage === null)
    return [
      {
        ...common,
        severity: 'unchecked',
        measure: null,
        message: `Whether ${name} must be scored is not known without the weight of ${stock.name}.`,
      },
    ]
  const advised = ruleLimits.scoreAdvised.value
  const insisted = ruleLimits.scoreInsisted.value
  const weight = `${String(Math.round(grammage))} g/m²`
  const isScored = (drawnBlanks(judged).get(name) ?? []).some((blank) => blank.scores.length > 0)
  const isHeavy = grammage >= advised
  const measure: Finding['measure'] = { actual: grammage, limit: advised, sense: 'at-most', unit: 'gsm' }
  if (isScored)
    return [
      {
        ...common,
        severity: 'pass',
        measure: null,
        message: `${name} is scored wherever it is folded${isHeavy ? `, as ${weight} asks for` : ''}.`,
      },
    ]
  return [
    {
      ...common,
      severity: isHeavy ? 'info' : 'pass',
      measure,
      message: isHeavy
        ? `${name} is bent without a score from ${stock.name} of ${weight}; ${grammage >= insisted ? `from ${String(insisted)} g/m² it cracks or stands off without one` : `from ${String(advised)} g/m² a score is advised`}. Give it scores, or use lighter paper.`
        : `${name} wraps without a score in paper of ${weight}.`,
    },
  ]
}

export const scoreNeededRule: Rule = {
  id: 'stock/score-needed',
  level: 'info',
  title: 'Heavy paper is scored where it is folded',
  why: 'Cover weights crack along a fold that was not scored, and stand off what they are wrapped round.',
  origin: {
    kind: 'published',
    source:
      'Mills and printers advise a score from 115, 150 or about 270 g/m²; 150 is taken. From 200 on it is common practice to insist.',
  },
  remedy: 'Give the piece scores, or use lighter paper for it.',
  judge: (judged) => [...judged.pieces].flatMap(([name, piece]) => judgePiece(judged, name, piece)),
}
