import { lengthText, sizeText } from '../../drawing/length-text.ts'
import type { FoldedPiece } from '../../pieces/folded-piece.ts'
import type { Millimetres } from '../../units/units.ts'
import type { ExportSet } from '../export-set.ts'
import { step, type Step } from './step.ts'

const kebab = (words: string): string => words.toLowerCase().replace(/[^a-z0-9]+/g, '-')

/** A piece's measure by the name it has in a placeholder: one length, or two for a size; `null` where it has none of that name. */
function dimensionOf(piece: FoldedPiece, name: string): readonly Millimetres[] | null {
  const { blank, outside, cavity } = piece
  const plain: Readonly<Record<string, readonly Millimetres[] | null>> = {
    blank: blank === null ? null : [blank.length, blank.width],
    'blank-length': blank === null ? null : [blank.length],
    'blank-width': blank === null ? null : [blank.width],
    outside: [outside.length.nominal, outside.width.nominal],
    length: [outside.length.nominal],
    width: [outside.width.nominal],
    height: [outside.height.nominal],
    inside: cavity === null ? null : [cavity.length.nominal, cavity.width.nominal],
    'inside-length': cavity === null ? null : [cavity.length.nominal],
    'inside-width': cavity === null ? null : [cavity.width.nominal],
    depth: cavity?.depth == null ? null : [cavity.depth.nominal],
  }
  const known = plain[name]
  if (known != null) return known
  const measure = piece.measures.find((candidate) => kebab(candidate.what) === name)
  return measure === undefined ? null : [measure.nominal]
}

/** An author's own sentence with its `{piece.dimension}` placeholders filled in; one that names nothing is left as it stands. */
export function fillSentence(set: ExportSet, sentence: string): string {
  return sentence.replace(/\{([a-z0-9-]+)\.([a-z0-9-]+)\}/g, (whole, pieceName: string, name: string) => {
    const piece = set.pieces.find((candidate) => candidate.name === pieceName)
    const lengths = piece === undefined ? null : dimensionOf(piece.folded, name)
    const [first, second] = lengths ?? []
    if (first === undefined) return whole
    return second === undefined ? lengthText(first, set.units) : sizeText(first, second, set.units)
  })
}

/** An author's own sentence as a step of its own. */
export const fillStep = (set: ExportSet, sentence: string): Step => step('', [fillSentence(set, sentence)])
