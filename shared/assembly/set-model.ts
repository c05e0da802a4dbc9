import type { FoldContext, Girded } from '../pieces/fold-context.ts'
import { foldPiece } from '../pieces/fold-registry.ts'
import type { FoldedPiece } from '../pieces/folded-piece.ts'
import type { PieceGiven } from '../pieces/given.ts'
import { stockCaliper } from '../stock/stock-caliper.ts'
import type { Fit, Maker, Stock, TemplateSet } from '../template/template-model.ts'
import { add, larger } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import { loadOf, stackHeight, type Load } from './loads.ts'

/** Under what circumstances a set is built: who makes it, from which paper, at which print scale. */
export interface ModelOptions {
  /** Class of makers for every piece that names none of its own. */
  readonly workmanship: string
  /** Stock that replaces a piece's own; `null` leaves it. */
  replaceStock(piece: PieceGiven): string | null
  readonly scale: number
}

/** Where a lid comes to rest on its base. */
export interface Seat {
  readonly base: string
  readonly lid: string
  /** Height of the lid's inside top above the table without regard to contents: max(base height, lid depth). */
  readonly rest: Dimension
  /** The same where the contents hold the lid up. */
  readonly z: Dimension
  /** Height of what lies in the base; `null` where nothing does. */
  readonly content: Dimension | null
  /** Height of base that shows below the lid; 0 where the lid reaches the table. */
  readonly exposed: number
}

/** A set with its pieces folded on demand, each once. */
export interface SetModel {
  readonly set: TemplateSet
  folded(piece: string): FoldedPiece
  stock(name: string): Stock
  /** Where the lid or base of that name closes; `null` for anything that is not part of a closed box. */
  seat(piece: string): Seat | null
  /** Outside of a piece as something to wrap or carry: a lid stands for its closed box. */
  closed(piece: string): Girded
  /** What a fit puts, as one load. */
  load(fit: Fit): Load
  /** Height of everything that is put into a box; `null` where nothing is. */
  contentHeight(box: string): Dimension | null
  /** Whether a fit puts a lid over that box. */
  hasLid(box: string): boolean
}

function makerOf(set: TemplateSet, piece: PieceGiven, workmanship: string): Maker {
  const name = piece.workmanship ?? workmanship
  const maker = set.tokens.makers.get(name)
  if (maker === undefined) throw new RangeError(`there is no class of makers called ${name}`)
  return maker
}

/** Builds the model of a set. References must have been resolved by the reader. */
export function modelSet(set: TemplateSet, options: ModelOptions): SetModel {
  const foldedByName = new Map<string, FoldedPiece>()
  const seatByBase = new Map<string, Seat>()
  const calipers = new Map<string, Dimension>()
  const { humidity } = set.tokens

  const stock = (name: string): Stock => {
    const found = set.tokens.stocks.get(name)
    if (found === undefined) throw new RangeError(`there is no stock called ${name}`)
    return found
  }
  const caliper = (name: string): Dimension => {
    const known = calipers.get(name)
    if (known !== undefined) return known
    const made = stockCaliper(stock(name))
    calipers.set(name, made)
    return made
  }
  const contextOf = (piece: PieceGiven): FoldContext => {
    const replacement = options.replaceStock(piece)
    const actual = (name: string): string => (replacement !== null && name === piece.stock ? replacement : name)
    return {
      maker: makerOf(set, piece, options.workmanship),
      ruler: set.tokens.ruler,
      scale: options.scale,
      humidityHalfRange: humidity === null ? 0 : (humidity.max - humidity.min) / 2,
      stock: (name) => stock(actual(name)),
      caliper: (name) => caliper(actual(name)),
      around: (name) => (set.pieces.has(name) ? closed(name) : null),
    }
  }
  const folded = (name: string): FoldedPiece => {
    const known = foldedByName.get(name)
    if (known !== undefined) return known
    const given = set.pieces.get(name)
    if (given === undefined) throw new RangeError(`there is no piece called ${name}`)
    const made = foldPiece(given, contextOf(given))
    foldedByName.set(name, made)
    return made
  }
  const lidFitOf = (base: string): Fit | null =>
    set.fits.find(
      (fit) => fit.relation === 'over' && fit.to === base && folded(fit.put[0]?.piece ?? '').cavity?.shape === 'tray',
    ) ?? null

  /** What lies in a box lies on one another; what stands reaches up by itself. */
  const contentHeight = (box: string): Dimension | null => {
    const loads = set.fits.filter((fit) => fit.relation === 'in' && fit.to === box).map((fit) => loadOf(model, fit))
    const lying = loads.filter((load) => !load.stands).map((load) => load.height)
    const standing = loads.filter((load) => load.stands).map((load) => load.height)
    const heights = [...(lying.length > 0 ? [add(...lying)] : []), ...standing]
    return heights.length === 0 ? null : heights.reduce((tallest, height) => larger(tallest, height))
  }
  const seatOn = (fit: Fit): Seat | null => {
    const known = seatByBase.get(fit.to)
    if (known !== undefined) return known
    const lidName = fit.put[0]?.piece
    if (lidName === undefined) return null
    const base = folded(fit.to)
    const lid = folded(lidName)
    if (lid.cavity?.depth == null) return null
    const rest = larger(base.outside.height, lid.cavity.depth)
    const content = contentHeight(fit.to)
    const floor = base.caliper ?? null
    const held = content === null ? null : floor === null ? content : add(floor, content)
    const seat: Seat = {
      base: fit.to,
      lid: lidName,
      rest,
      z: held === null ? rest : larger(rest, held),
      content,
      exposed: Math.max(0, rest.nominal - lid.cavity.depth.nominal),
    }
    seatByBase.set(fit.to, seat)
    return seat
  }
  const seat = (piece: string): Seat | null => {
    const fit = set.fits.find(
      (candidate) => candidate.relation === 'over' && (candidate.to === piece || candidate.put[0]?.piece === piece),
    )
    return fit === undefined ? null : seatOn(fit)
  }
  const closed = (piece: string): Girded => {
    const own = folded(piece)
    const over = set.fits.find((fit) => fit.relation === 'over' && fit.put[0]?.piece === piece)
    const rest = over === undefined ? null : seatOn(over)
    if (rest === null) return { ...own.outside, height: stackHeight(own) }
    // Above the seat lie the lid's own paper, its covering and what is stuck on its top.
    const { given } = own
    const covers =
      given.kind === 'box' || given.kind === 'lid'
        ? [
            ...(given.covered === null ? [] : [caliper(given.covered)]),
            ...given.layers.filter((layer) => layer.on === 'top').map((layer) => caliper(layer.stock)),
          ]
        : []
    return { ...own.outside, height: add(rest.z, ...(own.caliper === null ? [] : [own.caliper]), ...covers) }
  }
  const model: SetModel = {
    set,
    folded,
    stock,
    seat,
    closed,
    load: (fit) => loadOf(model, fit),
    contentHeight,
    hasLid: (box) => lidFitOf(box) !== null,
  }
  return model
}
