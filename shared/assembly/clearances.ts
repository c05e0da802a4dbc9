import { wrapLength } from '../pieces/band/fold-band.ts'
import type { FoldedPiece } from '../pieces/folded-piece.ts'
import { modelDefaults } from '../pieces/model-defaults.ts'
import type { AxisName } from '../report/report.ts'
import type { Fit } from '../template/template-model.ts'
import { add, apply, constant, scale, subtract } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import { goesAroundNothing, goesOverNothing, holdsNothing } from './impossible-fit.ts'
import type { Load } from './loads.ts'
import { requirementOf, type FitCase, type Requirement } from './requirements.ts'
import type { SetModel } from './set-model.ts'

/** One axis along which a fit is judged: outer inside minus inner outside, total, and what it must be. */
export interface AxisClearance {
  readonly axis: AxisName
  readonly clearance: Dimension
  readonly requirement: Requirement
  /** Interference that hands and paper take up on this axis, whatever the rest: a lid's walls lean. */
  readonly give: number
  /** The fit still closes down to this clearance although it is wanted higher; `null` where `min` is the limit. */
  readonly closesFrom: number | null
  /** Size of the inner piece along the axis, for bowing. */
  readonly contentSize: number
}

/** A way of putting one thing into another, with its axes. */
export interface Orientation {
  readonly isTurned: boolean
  readonly axes: readonly AxisClearance[]
}

/** Everything that can be said of a fit before it is judged. */
export interface FitClearances {
  readonly fitCase: FitCase
  /** The ways tried; one where the author says which or nothing can be turned. */
  readonly orientations: readonly Orientation[]
  readonly load: Load | null
  /** Room above a flat load in a tray, nominal, for bowing; `null` where nothing can bow. */
  readonly headroom: number | null
}

interface AxisParts {
  readonly axis: AxisName
  readonly outer: Dimension
  readonly inner: Dimension
  readonly contentSize: number
  readonly give?: number
  readonly closesFrom?: number
  readonly isOpen?: boolean
}

function axisOf(fit: Fit, fitCase: FitCase, parts: AxisParts): AxisClearance {
  return {
    axis: parts.axis,
    clearance: subtract(parts.outer, parts.inner),
    requirement: requirementOf(fit, fitCase, parts.axis, parts.contentSize, parts.isOpen ?? false),
    give: parts.give ?? 0,
    closesFrom: parts.closesFrom ?? null,
    contentSize: parts.contentSize,
  }
}

/**
 * What a flat content needs of a pocket along one axis: half the convex perimeter of its section.
 * Plain: c + T. Raised by h inside a rim r: c + T + √(r² + h²) − r.
 * @see physics B.1 (derived)
 */
export function pocketNeed(size: Dimension, thickness: Dimension, raised: FoldedPiece['raised']): Dimension {
  const plain = add(size, thickness)
  if (raised === null) return plain
  const slope = Math.hypot(raised.rim, raised.height.nominal)
  const climb = apply(raised.height, slope - raised.rim, slope === 0 ? 1 : raised.height.nominal / slope)
  return add(plain, climb)
}

function tries(fit: Fit, canTurn: boolean): readonly boolean[] {
  if (fit.turn === 'quarter') return [true]
  return fit.turn === 'none' || !canTurn ? [false] : [false, true]
}

function intoPocket(fit: Fit, pocket: FoldedPiece, load: Load): FitClearances {
  const cavity = pocket.cavity
  if (cavity === null) throw holdsNothing(fit, pocket)
  const orientations = tries(fit, true).map((isTurned) => ({
    isTurned,
    axes: (['length', 'width'] as const).map((axis) => {
      const size = (axis === 'length') === isTurned ? load.width : load.length
      return axisOf(fit, 'pocket', {
        axis,
        outer: cavity[axis],
        inner: pocketNeed(size, load.pressed, load.raised),
        contentSize: size.nominal,
        isOpen: cavity.open === axis,
      })
    }),
  }))
  return { fitCase: 'pocket', orientations, load, headroom: null }
}

function intoTray(model: SetModel, fit: Fit, box: FoldedPiece, load: Load): FitClearances {
  const cavity = box.cavity
  if (cavity === null) throw holdsNothing(fit, box)
  const depth =
    cavity.depth === null || model.hasLid(fit.to)
      ? []
      : [
          axisOf(fit, 'tray', {
            axis: 'depth',
            outer: cavity.depth,
            inner: load.height,
            contentSize: load.height.nominal,
          }),
        ]
  const headroom = cavity.depth === null ? null : cavity.depth.nominal - load.height.nominal
  const isDivider = load.stands && model.folded(fit.put[0]?.piece ?? fit.to).given.kind === 'divider'
  if (isDivider) {
    // A divider spans one axis, the one whose inside is nearest its length; where it is loosest it would only fall over.
    const nearest = (['width', 'length'] as const).toSorted(
      (a, b) => Math.abs(cavity[a].nominal - load.length.nominal) - Math.abs(cavity[b].nominal - load.length.nominal),
    )
    return {
      fitCase: 'divider',
      load,
      headroom: null,
      orientations: tries(fit, false).map((isTurned) => {
        const axis = nearest[isTurned ? 1 : 0] ?? 'width'
        return {
          isTurned,
          axes: [
            axisOf(fit, 'divider', { axis, outer: cavity[axis], inner: load.length, contentSize: load.length.nominal }),
            ...depth,
          ],
        }
      }),
    }
  }
  return {
    fitCase: 'tray',
    load,
    headroom: load.isFlat ? headroom : null,
    orientations: tries(fit, true).map((isTurned) => ({
      isTurned,
      axes: [
        ...(['length', 'width'] as const).map((axis) => {
          const size = (axis === 'length') === isTurned ? load.width : load.length
          return axisOf(fit, 'tray', { axis, outer: cavity[axis], inner: size, contentSize: size.nominal })
        }),
        ...depth,
      ],
    })),
  }
}

/** Into a bag or through a tube: the two axes of its section, width (face) and depth (gusset). */
function intoSection(fit: Fit, outer: FoldedPiece, load: Load, fitCase: 'bag' | 'sleeve'): FitClearances {
  const cavity = outer.cavity
  if (cavity?.depth == null) throw holdsNothing(fit, outer)
  const face = cavity.length
  const gusset = cavity.width
  // Things stand in a bag unless the author lays them flat.
  const [along, through] =
    fitCase === 'bag' && fit.stands !== 'flat' && !load.stands ? [load.length, load.height] : [load.length, load.width]
  return {
    fitCase,
    load,
    headroom: null,
    orientations: tries(fit, true).map((isTurned) => ({
      isTurned,
      axes: [
        axisOf(fit, fitCase, {
          axis: 'width',
          outer: face,
          inner: isTurned ? through : along,
          contentSize: (isTurned ? through : along).nominal,
        }),
        axisOf(fit, fitCase, {
          axis: 'depth',
          outer: gusset,
          inner: isTurned ? along : through,
          contentSize: (isTurned ? along : through).nominal,
        }),
      ],
    })),
  }
}

function sleeveAround(model: SetModel, fit: Fit, sleeve: FoldedPiece, inner: string): FitClearances {
  const cavity = sleeve.cavity
  if (cavity?.depth == null || sleeve.form.kind !== 'sleeve') throw goesAroundNothing(fit, sleeve, inner)
  const around = model.closed(inner)
  const axis = sleeve.form.wrapped
  return {
    fitCase: 'sleeve',
    load: null,
    headroom: null,
    orientations: [
      {
        isTurned: false,
        axes: [
          axisOf(fit, 'sleeve', { axis, outer: cavity[axis], inner: around[axis], contentSize: around[axis].nominal }),
          axisOf(fit, 'sleeve', {
            axis: 'depth',
            outer: cavity.depth,
            inner: around.height,
            contentSize: around.height.nominal,
          }),
        ],
      },
    ],
  }
}

/** What a tight wrap leaves to lap: strip − [2(w + h) + πt]; for a ribbon, what is left to tie. */
function wrapAround(model: SetModel, fit: Fit, band: FoldedPiece): FitClearances {
  if (band.form.kind !== 'band' || band.given.kind !== 'band') throw new RangeError(`${band.given.name} is no band`)
  const around = model.closed(fit.to)
  const across = band.form.wrapped === 'width' ? around.width : around.length
  const caliper = band.caliper ?? constant(0)
  const girth = add(scale(across, 2), scale(around.height, 2), scale(caliper, Math.PI))
  const nominal = wrapLength(around, band.form.wrapped, caliper.nominal)
  const fitCase: FitCase = band.form.ribbon ? (band.given.tie === 'knot' ? 'ribbon-knot' : 'ribbon-bow') : 'band'
  return {
    fitCase,
    load: null,
    headroom: null,
    orientations: [
      {
        isTurned: false,
        axes: [
          axisOf(fit, fitCase, {
            axis: 'overlap',
            outer: band.form.stripLength,
            inner: girth,
            contentSize: nominal,
            closesFrom: 0,
          }),
        ],
      },
    ],
  }
}

function lidOver(model: SetModel, fit: Fit, lid: FoldedPiece): FitClearances {
  const base = model.folded(fit.to)
  const cavity = lid.cavity
  if (cavity === null) throw holdsNothing(fit, lid)
  if (cavity.shape !== 'tray') throw goesOverNothing(fit, lid)
  const seat = model.seat(fit.to)
  const isTurned = fit.turn === 'quarter'
  const sides = (['length', 'width'] as const).map((axis) => {
    const inner = base.outside[(axis === 'length') === isTurned ? 'width' : 'length']
    return axisOf(fit, 'lid', {
      axis,
      outer: cavity[axis],
      inner,
      contentSize: inner.nominal,
      give: modelDefaults.lidGive.value,
    })
  })
  const headspace =
    seat === null || seat.content === null
      ? []
      : [
          axisOf(fit, 'lid', {
            axis: 'headspace',
            outer: base.caliper === null ? seat.rest : subtract(seat.rest, base.caliper),
            inner: seat.content,
            contentSize: seat.content.nominal,
          }),
        ]
  return { fitCase: 'lid', load: null, headroom: null, orientations: [{ isTurned, axes: [...sides, ...headspace] }] }
}

/** All clearances of a fit, by what is put and where. */
export function clearancesOf(model: SetModel, fit: Fit): FitClearances {
  const outerOrPut = model.folded(fit.put[0]?.piece ?? fit.to)
  if (fit.relation === 'over') return lidOver(model, fit, outerOrPut)
  if (fit.relation === 'around') {
    return outerOrPut.form.kind === 'band'
      ? wrapAround(model, fit, outerOrPut)
      : sleeveAround(model, fit, outerOrPut, fit.to)
  }
  const outer = model.folded(fit.to)
  const load = model.load(fit)
  switch (outer.cavity?.shape) {
    case 'pocket':
      return intoPocket(fit, outer, load)
    case 'bag':
      return intoSection(fit, outer, load, 'bag')
    case 'tube':
      return sleeveAround(model, fit, outer, fit.put[0]?.piece ?? fit.to)
    case 'tray':
    case undefined:
      return intoTray(model, fit, outer, load)
  }
}
