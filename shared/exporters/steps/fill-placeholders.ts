import { lengthText, sizeText } from '../../drawing/length-text.ts'
import { pieceDimensions } from '../../pieces/piece-dimensions.ts'
import type { ExportSet } from '../export-set.ts'
import { step, type Step } from './step.ts'

/** An author's own sentence with its `{piece.dimension}` placeholders filled in; one that names nothing is left as it stands. */
export function fillSentence(set: ExportSet, sentence: string): string {
  return sentence.replace(/\{([a-z0-9-]+)\.([a-z0-9-]+)\}/g, (whole, pieceName: string, name: string) => {
    const piece = set.pieces.find((candidate) => candidate.name === pieceName)
    const lengths = piece === undefined ? undefined : pieceDimensions(piece.folded).get(name)
    const [first, second] = lengths ?? []
    if (first === undefined) return whole
    return second === undefined ? lengthText(first, set.units) : sizeText(first, second, set.units)
  })
}

/** An author's own sentence as a step of its own. */
export const fillStep = (set: ExportSet, sentence: string): Step => step('', [fillSentence(set, sentence)])
