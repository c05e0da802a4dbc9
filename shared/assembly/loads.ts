import type { FoldedPiece } from '../pieces/folded-piece.ts'
import { modelDefaults } from '../pieces/model-defaults.ts'
import type { Fit } from '../template/template-model.ts'
import { add, constant, dimension, larger, multiply, scale, source } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import type { SetModel } from './set-model.ts'

/** What a fit puts into, over or around something, as one thing. */
export interface Load {
  /** In the plane as it lies; for a load that stands, along the floor. */
  readonly length: Dimension
  readonly width: Dimension
  /** Upright extent. */
  readonly height: Dimension
  /** Thickness of the flat thing pressed, without what is raised: what a pocket must go round. */
  readonly pressed: Dimension
  readonly raised: FoldedPiece['raised']
  readonly stands: boolean
  /** A flat thing or a pack of flat things, which can be bowed by hand. */
  readonly isFlat: boolean
  /** Bounds of a pack's height by layers, compression and loft; `null` for a single thing. */
  readonly pack: { readonly min: number; readonly nominal: number; readonly max: number } | null
}

/** Height of a piece lying by itself, with what is raised on it. */
export const stackHeight = (piece: FoldedPiece): Dimension =>
  piece.raised === null ? piece.outside.height : add(piece.outside.height, piece.raised.height)

interface Unit {
  readonly count: number
  readonly piece: FoldedPiece
  /** Thickness with what it holds. */
  readonly thickness: Dimension
  readonly least: number
  readonly most: number
}

/** Thickest and thinnest an empty envelope is anywhere, by its layer map; the same for other pieces. */
function layerBounds(piece: FoldedPiece): { readonly least: number; readonly most: number } {
  const nominal = stackHeight(piece).nominal
  if (piece.form.kind !== 'envelope' || piece.caliper === null) return { least: nominal, most: nominal }
  const { min, mean, max } = piece.form.layers
  const caliper = piece.caliper.nominal
  return { least: nominal + (min - mean) * caliper, most: nominal + (max - mean) * caliper }
}

function unitsOf(model: SetModel, fit: Fit): readonly Unit[] {
  return fit.put.map(({ count, piece: name }) => {
    const piece = model.folded(name)
    const holds =
      fit.holding !== null && (fit.put.length === 1 || piece.cavity !== null) ? model.folded(fit.holding) : null
    const held = holds === null ? constant(0) : stackHeight(holds)
    const bounds = layerBounds(piece)
    return {
      count: count * fit.count,
      piece,
      thickness: add(stackHeight(piece), held),
      least: bounds.least + held.nominal,
      most: bounds.most + held.nominal,
    }
  })
}

const isSheet = (piece: FoldedPiece): boolean =>
  piece.form.kind === 'card' ||
  piece.form.kind === 'envelope' ||
  piece.form.kind === 'insert' ||
  (piece.form.kind === 'bought' && piece.form.body !== 'box')

/**
 * Height of a pack: Σ n[(content + N·t)(1 + b) + loft], b and loft shared by the pack so that their errors add.
 * A single unfolded thing is no pack: nothing compresses and nothing springs.
 * @see physics D (form derived, inputs guessed)
 */
function packHeight(fit: Fit, units: readonly Unit[]): { readonly height: Dimension; readonly pack: Load['pack'] } {
  const plain = add(...units.map((unit) => scale(unit.thickness, unit.count)))
  const folded = units.reduce((sum, unit) => sum + (unit.piece.isFolded ? unit.count : 0), 0)
  const total = units.reduce((sum, unit) => sum + unit.count, 0)
  if ((total === 1 && folded === 0) || !units.every((unit) => isSheet(unit.piece))) return { height: plain, pack: null }
  const compression = dimension(1 + modelDefaults.packCompression.value, [
    source(`pack-compression(${fit.id})`, 1, modelDefaults.packCompressionHalfWidth.value),
  ])
  const loft = dimension(modelDefaults.loft.value, [source(`loft(${fit.id})`, 1, modelDefaults.loftHalfWidth.value)])
  const height = add(multiply(plain, compression), scale(loft, folded))
  const most = modelDefaults.packCompression.value + modelDefaults.packCompressionHalfWidth.value
  const highest = modelDefaults.loft.value + modelDefaults.loftHalfWidth.value
  return {
    height,
    pack: {
      min: units.reduce((sum, unit) => sum + unit.count * unit.least, 0),
      nominal: height.nominal,
      max: units.reduce((sum, unit) => sum + unit.count * unit.most, 0) * (1 + most) + folded * highest,
    },
  }
}

/** What a fit puts, as one load: the widest of a stack in the plane, its height as a pack. */
export function loadOf(model: SetModel, fit: Fit): Load {
  const units = unitsOf(model, fit)
  const first = units[0]
  if (first === undefined) throw new RangeError(`${fit.id} puts nothing`)
  const { height, pack } = packHeight(fit, units)
  const single = fit.put.length === 1 ? (fit.put[0]?.piece ?? null) : null
  // A closed box or any other solid thing is carried as it stands.
  const isSolid =
    first.piece.form.kind === 'box' || first.piece.form.kind === 'sleeve' || first.piece.form.kind === 'bag'
  const plane =
    single !== null && isSolid
      ? model.closed(single)
      : {
          length: units.map((unit) => unit.piece.outside.length).reduce((widest, next) => larger(widest, next)),
          width: units.map((unit) => unit.piece.outside.width).reduce((widest, next) => larger(widest, next)),
          height,
        }
  const isDivider = first.piece.form.kind === 'insert' && first.piece.form.standing
  const stands = fit.stands === null ? isDivider : fit.stands === 'upright'
  const pressed = add(
    ...units.map((unit) =>
      scale(
        unit.piece.raised === null ? unit.thickness : add(unit.thickness, scale(unit.piece.raised.height, -1)),
        unit.count,
      ),
    ),
  )
  return {
    length: plane.length,
    width: stands ? plane.height : plane.width,
    height: stands ? plane.width : plane.height,
    pressed,
    raised: first.piece.raised,
    stands,
    isFlat: !isSolid && !stands && units.every((unit) => isSheet(unit.piece)),
    pack,
  }
}
