import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { FoldedPiece } from '../../../pieces/folded-piece.ts'
import { pieceDimensions } from '../../../pieces/piece-dimensions.ts'
import { nearestName } from '../../../units/did-you-mean.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, listInWords } from '../../wording.ts'
import { addsUp, offBy, sumsOf } from './adds-up.ts'

function judgePiece(judged: JudgedSet, name: string, piece: FoldedPiece): readonly Finding[] {
  const sums = sumsOf(piece)
  const worst = sums.toSorted((a, b) => offBy(b) - offBy(a))[0]
  if (worst === undefined) return []
  const isRight = addsUp(worst)
  return [
    {
      subject: name,
      severity: isRight ? 'pass' : 'fail',
      measure: { actual: offBy(worst), limit: ruleLimits.addsUpWithin.value, sense: 'at-most', unit: 'mm' },
      message: isRight
        ? `The measures of ${name} add up.`
        : `The measures of ${name} do not add up: ${worst.what} ${worst.what.endsWith('together') || worst.what.includes(' and ') ? 'make' : 'is'} ${inSetUnits(judged, worst.is)}, and ${worst.stated} asks for ${inSetUnits(judged, worst.must)}. Change one of them by ${inSetUnits(judged, offBy(worst))}.`,
      path: ['pieces', name],
    },
  ]
}

const placeholder = /\{([^{}]*)\}/g

/** What is wrong with a placeholder; `null` where it names a measure of a piece. */
function wrongWith(judged: JudgedSet, text: string): string | null {
  const [pieceName = '', dimension, ...more] = text.split('.')
  const piece = judged.pieces.get(pieceName)
  if (piece === undefined) {
    const meant = nearestName(pieceName, judged.pieces.keys())
    return `{${text}} names no piece${meant === null ? '' : ` (“${meant}”?)`}`
  }
  const known = pieceDimensions(piece)
  if (dimension !== undefined && more.length === 0 && known.has(dimension)) return null
  const meant = dimension === undefined ? null : nearestName(dimension, known.keys())
  const offer = meant === null ? `it has ${listInWords([...known.keys()])}` : `perhaps {${pieceName}.${meant}} is meant`
  return `{${text}} names no measure of ${pieceName} (${offer})`
}

function judgeSentences(judged: JudgedSet): readonly Finding[] {
  const { steps, name } = judged.set
  if (steps === 'auto') return []
  const wrong = steps.flatMap((sentence, index) =>
    [...sentence.matchAll(placeholder)].flatMap((match) => {
      const fact = wrongWith(judged, match[1] ?? '')
      return fact === null ? [] : [{ index, fact }]
    }),
  )
  const [first] = wrong
  return [
    {
      subject: name,
      severity: first === undefined ? 'pass' : 'fail',
      measure: { actual: wrong.length, limit: 0, sense: 'at-most', unit: 'count' },
      message:
        first === undefined
          ? `Every measure that the steps name is one of a piece.`
          : `The steps name measures that there are none of: ${listInWords(
              wrong.map((each) => each.fact),
              3,
            )}.`,
      path: first === undefined ? ['steps'] : ['steps', first.index],
    },
  ]
}

export const stepsRule: Rule = {
  id: 'set/steps',
  level: 'fail',
  title: 'The measures in the steps add up',
  why: 'Makers cut what they read. Panels that do not make the blank, or a sentence with a measure that is none, waste the sheet.',
  origin: {
    kind: 'derived',
    source: 'Sums among the measures of each piece, and the measures that own sentences name.',
  },
  remedy: 'Change the measure that is off; in own steps write {piece.dimension}, such as {base.blank}.',
  judge: (judged) => [
    ...[...judged.pieces].flatMap(([name, piece]) => judgePiece(judged, name, piece)),
    ...judgeSentences(judged),
  ],
}
