import { bareLength, lengthText } from '../../drawing/length-text.ts'
import { ceilToGrid, isOnGrid, roundToGrid } from '../../units/grid.ts'
import type { ExportSet, LidPair } from '../export-set.ts'
import type { StepTable } from './step.ts'

/** How far a base that came out otherwise is still answered for, in marks either way. */
const marksEachWay = 4

/**
 * The lid's cut size for what the base measures: as much larger or smaller than designed as the base is, up to the next
 * mark, its scores unchanged, so that the clearance stays what it was designed to be (derived).
 */
export function lidTable(set: ExportSet, { base, lid }: LidPair): StepTable | null {
  const [made, cover] = [base, lid].map((name) => set.pieces.find((piece) => piece.name === name)?.folded)
  const blank = cover?.blank
  if (made === undefined || blank == null) return null
  // A lid designed between two marks is answered between marks.
  const mark = set.ruler.cut
  const fine = isOnGrid(blank.length, mark) && isOnGrid(blank.width, mark) ? mark : mark / 2
  const row = (marks: number): readonly string[] => {
    const answer = (axis: 'length' | 'width'): readonly [string, string] => {
      const designed = made.outside[axis].nominal
      const measured = roundToGrid(designed, mark) + marks * mark
      return [
        bareLength(measured, set.units),
        lengthText(ceilToGrid(blank[axis] + measured - designed, fine), set.units),
      ]
    }
    return [...answer('length'), ...answer('width')]
  }
  const rows = Array.from({ length: 2 * marksEachWay + 1 }, (_, index) => row(index - marksEachWay))
  return {
    head: [`${base} is long (${set.units})`, `cut ${lid} long`, `${base} is wide (${set.units})`, `cut ${lid} wide`],
    rows,
  }
}
