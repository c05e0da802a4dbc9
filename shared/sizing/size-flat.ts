import { modelSet, type ModelOptions } from '../assembly/set-model.ts'
import type { BagGiven } from '../pieces/bag/bag-given.ts'
import type { InsertGiven } from '../pieces/insert/insert-given.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { Fit, TemplateSet } from '../template/template-model.ts'
import { distributionOf } from '../uncertainty/distribution.ts'
import { ceilToGrid, floorToGrid } from '../units/grid.ts'
import { axisAsLaid, keepsLeast, leastValue, requirementInWords, type Bound } from './least-value.ts'
import type { SizedPiece, Unsizable } from './size-box.ts'
import type { ChosenSize } from './sizing.ts'

interface Trial {
  readonly set: TemplateSet
  readonly options: ModelOptions
}

const axisOf = (trial: Trial, piece: PieceGiven, fit: Fit, axis: string) => {
  const set = { ...trial.set, pieces: new Map([...trial.set.pieces, [piece.name, piece]]) }
  return axisAsLaid(modelSet(set, trial.options), { ...fit, turn: fit.turn ?? 'none' }, axis)
}

/** The largest insert or divider that still goes into what holds it, on the cutting grid. */
export function sizeInsert(whole: TemplateSet, trial: Trial, given: InsertGiven): SizedPiece<InsertGiven> | Unsizable {
  const { ruler, target } = whole.tokens
  const fit = trial.set.fits.find(
    (candidate) => candidate.relation === 'in' && candidate.put.some((entry) => entry.piece === given.name),
  )
  const holder = fit === undefined ? undefined : modelSet(trial.set, trial.options).folded(fit.to).cavity
  if (fit === undefined || holder == null) {
    return {
      requirement: `size of ${given.name}`,
      message: `${given.name} goes into nothing that has a size`,
      nearest: `give its size, or a fit that puts it in something`,
    }
  }
  const isDivider = given.kind === 'divider'
  const largest = {
    length: isDivider ? holder.width.nominal : holder.length.nominal,
    width: isDivider ? (holder.depth?.nominal ?? 20) : holder.width.nominal,
  }
  const sized = (length: number, width: number): InsertGiven => ({ ...given, size: { length, width } })
  const find = (
    side: 'length' | 'width',
    axis: string,
    start: number,
    of: (value: number) => InsertGiven,
  ): ChosenSize | null => {
    let value = ceilToGrid(start, ruler.cut)
    for (let step = 0; step < 4000 && value > ruler.cut; step += 1) {
      const judged = axisOf(trial, of(value), fit, axis)
      if (keepsLeast(judged.clearance, judged.requirement.band, target)) {
        const least = judged.requirement.band.min ?? 0
        const spare = distributionOf(judged.clearance).quantile(1 - target) - least
        return {
          piece: given.name,
          path: ['pieces', given.name, 'size'],
          what: side,
          value,
          unrounded: value + spare,
          limitedBy: requirementInWords(fit.id, judged),
        }
      }
      value = floorToGrid(value - ruler.cut, ruler.cut)
    }
    return null
  }
  const spans = isDivider ? 'width' : 'length'
  const length = find('length', spans, largest.length, (value) => sized(value, Math.min(value, largest.width)))
  const height: ChosenSize | null = isDivider
    ? {
        piece: given.name,
        path: ['pieces', given.name, 'size'],
        what: 'height',
        value: floorToGrid(largest.width - 1, ruler.cut),
        unrounded: largest.width - 1,
        limitedBy: `stands a millimetre below the rim of ${fit.to}`,
      }
    : find('width', 'width', largest.width, (value) => sized(Math.max(value, length?.value ?? value), value))
  if (length === null || height === null) {
    return {
      requirement: `${fit.id}`,
      message: `no size of ${given.name} on the ruler goes into ${fit.to}`,
      nearest: 'use a finer ruler or a smaller clearance',
    }
  }
  return { given: sized(length.value, height.value), chosen: [length, height] }
}

/** The least bag that its contents go into, on the scoring grid; as high as they stand and a third more. */
export function sizeBag(whole: TemplateSet, trial: Trial, given: BagGiven): SizedPiece<BagGiven> | Unsizable {
  const { ruler, target } = whole.tokens
  const fits = trial.set.fits.filter((fit) => fit.relation === 'in' && fit.to === given.name)
  const first = fits[0]
  if (first === undefined) {
    return {
      requirement: `inside of ${given.name}`,
      message: `nothing goes into ${given.name}`,
      nearest: `give its inside, or a fit that puts something in ${given.name}`,
    }
  }
  const sized = (width: number, depth: number, height: number): BagGiven => ({
    ...given,
    inside: { width, depth, height },
  })
  const roomy = 600
  const boundsOf = (axis: 'width' | 'depth'): readonly Bound[] =>
    fits.map((fit) => {
      const at = (value: number) => {
        const found = axisOf(
          trial,
          axis === 'width' ? sized(value, roomy, roomy) : sized(roomy, value, roomy),
          fit,
          axis,
        )
        return found
      }
      return {
        requirement: requirementInWords(fit.id, at(roomy)),
        clearanceAt: (value) => ({
          clearance: at(value).clearance,
          band: at(value).requirement.band,
        }),
      }
    })
  const width = leastValue(boundsOf('width'), roomy, ruler.score, target)
  const depth = leastValue(boundsOf('depth'), roomy, ruler.score, target)
  if (width === null || depth === null)
    return { requirement: first.id, message: `nothing limits ${given.name}`, nearest: null }
  const load = modelSet(trial.set, trial.options).load(first)
  const stands = first.stands === 'flat' || load.stands ? load.height : load.width
  const high = (stands.nominal * 4) / 3
  const path = ['pieces', given.name, 'inside']
  const height = ceilToGrid(high, ruler.score)
  return {
    given: sized(width.value, depth.value, height),
    chosen: [
      { piece: given.name, path, what: 'width', ...width },
      { piece: given.name, path, what: 'depth', ...depth },
      {
        piece: given.name,
        path,
        what: 'height',
        value: height,
        unrounded: high,
        limitedBy: `a third more than what stands in it (common practice)`,
      },
    ],
  }
}
