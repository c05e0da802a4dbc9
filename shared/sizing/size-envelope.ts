import { modelSet, type ModelOptions } from '../assembly/set-model.ts'
import type {
  BaronialByCorners,
  BaronialByPocket,
  EnvelopeGiven,
  SquareFlapGiven,
} from '../pieces/envelope/envelope-given.ts'
import type { Fit, TemplateSet } from '../template/template-model.ts'
import { ceilToGrid, floorToGrid } from '../units/grid.ts'
import { axisAsLaid, leastValue, requirementInWords, type Bound, type Least } from './least-value.ts'
import type { SizedPiece, Unsizable } from './size-box.ts'

interface Trial {
  readonly set: TemplateSet
  readonly options: ModelOptions
}

type Open = BaronialByPocket | SquareFlapGiven

const pocketOf = (given: Open, length: number, width: number): Open => ({ ...given, pocket: { length, width } })

const roomy = 600

function bounds(trial: Trial, given: Open, axis: 'length' | 'width'): readonly Bound[] {
  const fits = trial.set.fits.filter((fit) => fit.relation === 'in' && fit.to === given.name)
  return fits.map((fit) => {
    const asLaid: Fit = { ...fit, turn: fit.turn ?? 'none' }
    const at = (value: number) => {
      const piece = axis === 'length' ? pocketOf(given, value, value) : pocketOf(given, Math.max(roomy, value), value)
      const set = { ...trial.set, pieces: new Map([...trial.set.pieces, [given.name, piece as EnvelopeGiven]]) }
      return axisAsLaid(modelSet(set, trial.options), asLaid, axis)
    }
    return {
      requirement: requirementInWords(fit.id, at(roomy)),
      clearanceAt: (value) => {
        const { clearance, requirement } = at(value)
        return { clearance, band: requirement.band }
      },
    }
  })
}

interface Corners {
  readonly square: number
  readonly sides: number
  readonly bottom: number
  readonly flap: number
}

/**
 * The least square, and distances from its corners, all on ruler marks, whose pocket is no smaller than asked and whose
 * seams are no narrower: W = √2(S − a), seam = a_side + a_end − S. @see physics B.5 (derived)
 */
export function leastSquare(
  pocket: { readonly along: number; readonly across: number },
  seam: { readonly bottom: number; readonly top: number },
  grid: { readonly cut: number; readonly score: number },
): Corners {
  const exact = (pocket.along + pocket.across) * Math.SQRT1_2 + (seam.bottom + seam.top) / 2
  for (let square = ceilToGrid(exact, grid.cut); ; square += grid.cut) {
    const sides = floorToGrid(square - pocket.along * Math.SQRT1_2, grid.score)
    const bottom = ceilToGrid(square + seam.bottom - sides, grid.score)
    const flap = ceilToGrid(square + seam.top - sides, grid.score)
    if (bottom + flap <= 2 * square - Math.SQRT2 * pocket.across + 1e-6) return { square, sides, bottom, flap }
  }
}

function cornersGiven(given: BaronialByPocket, { square, sides, bottom, flap }: Corners): BaronialByCorners {
  const { pocket: _pocket, seam: _seam, by: _by, ...rest } = given
  return { ...rest, by: 'corners', square, corners: { left: sides, right: sides, bottom, flap } }
}

/** Sizes an envelope from what goes into it. A measured baronial comes out as a square and corners on ruler marks. */
export function sizeEnvelope(whole: TemplateSet, trial: Trial, given: Open): SizedPiece<EnvelopeGiven> | Unsizable {
  const { ruler, target } = whole.tokens
  const isByCorners = given.style === 'baronial' && given.made === 'measured'
  // A pocket given by its square lands on the marks of the square; the pocket itself need not.
  const grid = isByCorners ? 1e-3 : ruler.score
  const length = leastValue(bounds(trial, given, 'length'), roomy, grid, target)
  const width = leastValue(bounds(trial, given, 'width'), roomy, grid, target)
  if (length === null || width === null) {
    return {
      requirement: `pocket of ${given.name}`,
      message: `nothing goes into ${given.name}, so nothing says how large its pocket must be`,
      nearest: `give its pocket, or a fit that puts something in ${given.name}`,
    }
  }
  const pocketPath = ['pieces', given.name, 'pocket']
  if (!isByCorners) {
    return {
      given: pocketOf(given, Math.max(length.value, width.value), width.value),
      chosen: [
        { piece: given.name, path: pocketPath, what: 'pocket length', ...length },
        { piece: given.name, path: pocketPath, what: 'pocket width', ...width },
      ],
    }
  }
  const along = Math.max(length.value, width.value)
  const corners = leastSquare({ along, across: width.value }, given.seam, ruler)
  const choice = (what: string, value: number, unrounded: number, from: Least) => ({
    piece: given.name,
    path: pocketPath,
    what,
    value,
    unrounded,
    limitedBy: from.limitedBy,
  })
  const exact = (along + width.value) * Math.SQRT1_2 + (given.seam.bottom + given.seam.top) / 2
  return {
    given: cornersGiven(given, corners),
    chosen: [
      choice('square', corners.square, exact, length),
      choice('side corners', corners.sides, corners.square - along * Math.SQRT1_2, length),
      {
        ...choice('bottom corner', corners.bottom, corners.square + given.seam.bottom - corners.sides, width),
        limitedBy: `bottom seam: at least ${String(given.seam.bottom)} mm`,
      },
      {
        ...choice('flap corner', corners.flap, corners.square + given.seam.top - corners.sides, width),
        limitedBy: `top seam: at least ${String(given.seam.top)} mm`,
      },
    ],
  }
}
