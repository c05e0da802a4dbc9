import type { JudgedAxis } from '../../assembly/judge-axis.ts'
import type { Measure } from '../../pieces/folded-piece.ts'
import { worstCase } from '../../uncertainty/moments.ts'
import { oncePerSet } from '../once-per-set.ts'

/** Every measure makers set, by the name of its source. */
export const measureById = oncePerSet((judged): ReadonlyMap<string, Measure> => {
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

/** The measures a clearance depends on; printed pieces have none. */
export function marksOf(axis: JudgedAxis, measures: ReadonlyMap<string, Measure>): readonly MarkOfAxis[] {
  return axis.clearance.clearance.sources.flatMap((source) => {
    const measure = source.halfWidth === 0 ? measures.get(source.name) : undefined
    return measure === undefined ? [] : [{ measure, coefficient: source.coefficient }]
  })
}

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
