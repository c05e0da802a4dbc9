import type { JudgedAxis } from '../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../assembly/judge-fit.ts'
import type { Measure } from '../../pieces/folded-piece.ts'
import { worstCase } from '../../uncertainty/moments.ts'
import { oncePerSet } from '../once-per-set.ts'

/** Every measure makers set, by the name of its source. */
const measureById = oncePerSet((judged): ReadonlyMap<string, Measure> => {
  const measures = new Map<string, Measure>()
  for (const piece of judged.pieces.values())
    for (const measure of piece.measures) if (!measures.has(measure.id)) measures.set(measure.id, measure)
  return measures
})

/** A measure on which a clearance depends: how far it moves for each millimetre the measure is off. */
export interface MarkOfAxis {
  readonly measure: Measure
  readonly coefficient: number
}

/** An axis that depends on measures, with them. */
export interface MarkedAxis {
  readonly axis: JudgedAxis
  readonly marks: readonly MarkOfAxis[]
}

function marksOf(axis: JudgedAxis, measures: ReadonlyMap<string, Measure>): readonly MarkOfAxis[] {
  const marks: MarkOfAxis[] = []
  for (const source of axis.clearance.clearance.sources) {
    const measure = source.halfWidth === 0 ? measures.get(source.name) : undefined
    if (measure !== undefined) marks.push({ measure, coefficient: source.coefficient })
  }
  return marks
}

/** The axes of every fit that depend on measures makers set; printed pieces have none, and their fits are left out. */
export const markedFits = oncePerSet((judged): ReadonlyMap<JudgedFit, readonly MarkedAxis[]> => {
  const measures = measureById(judged)
  const marked = new Map<JudgedFit, readonly MarkedAxis[]>()
  for (const fit of judged.fits) {
    const axes = fit.axes.map((axis) => ({ axis, marks: marksOf(axis, measures) }))
    if (axes.some(({ marks }) => marks.length > 0)) marked.set(fit, axes)
  }
  return marked
})

/**
 * Whether an axis could fail at all when its clearance is moved, by the worst case: saves working out shares that are none.
 * @param shift added to the clearance
 */
export function mayFailAt(axis: JudgedAxis, shift: number): boolean {
  const { clearance, closesFrom, requirement } = axis.clearance
  const { min, max } = worstCase(clearance)
  const low = axis.give > 0 ? -axis.give : (closesFrom ?? requirement.band.min)
  const isTight = low !== null && min + shift < low
  const isLoose = requirement.isStrict && requirement.band.max !== null && max + shift > requirement.band.max
  return isTight || isLoose
}
