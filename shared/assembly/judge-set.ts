import type { CheckOptions } from '../check-options.ts'
import type { FoldedPiece } from '../pieces/folded-piece.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { Fit, TemplateSet } from '../template/template-model.ts'
import { jointProbability } from '../uncertainty/joint.ts'
import { judgeFit, type JudgedFit } from './judge-fit.ts'
import { modelSet, type ModelOptions, type SetModel } from './set-model.ts'

/** The same fit with another paper. */
export interface PaperTrial {
  readonly stock: string
  readonly judged: JudgedFit
}

/** A set with every piece folded and every fit judged: what rules look at. */
export interface JudgedSet {
  readonly set: TemplateSet
  readonly options: CheckOptions
  readonly workmanship: string
  readonly model: SetModel
  readonly pieces: ReadonlyMap<string, FoldedPiece>
  readonly fits: readonly JudgedFit[]
  readonly papers: ReadonlyMap<string, readonly PaperTrial[]>
  /** How many of each piece to make. */
  readonly makes: ReadonlyMap<string, number>
  /** Share of builds in which every fit closes. */
  readonly works: number
}

const isCutFromPaper = (piece: PieceGiven): boolean => piece.stock !== null

/** How the set is modelled when a check asks for other makers, another paper or another print scale. */
export function modelOptionsOf(set: TemplateSet, options: CheckOptions): ModelOptions {
  const paper = options.paper ?? null
  return {
    workmanship: options.workmanship ?? set.tokens.workmanship,
    replaceStock: (piece) => (paper !== null && isCutFromPaper(piece) ? paper : null),
    scale: options.scale ?? 1,
  }
}

/** How many of each piece a set needs: the most any fit asks for, carried along the chain of what holds what. */
export function countPieces(set: TemplateSet): ReadonlyMap<string, number> {
  const counts = new Map<string, number>()
  const raise = (piece: string, count: number): void => {
    counts.set(piece, Math.max(counts.get(piece) ?? 1, count))
  }
  for (const [name, piece] of set.pieces)
    raise(name, piece.kind === 'insert' || piece.kind === 'divider' ? piece.count : 1)
  for (const fit of set.fits) {
    for (const entry of fit.put) raise(entry.piece, entry.count * fit.count)
    if (fit.holding !== null) raise(fit.holding, fit.put.reduce((sum, entry) => sum + entry.count, 0) * fit.count)
  }
  // Whatever is put into a thing that is itself made several times is needed in each of them.
  for (const fit of set.fits) {
    const outer = counts.get(fit.to) ?? 1
    if (fit.relation === 'in' && outer > 1)
      for (const entry of fit.put) raise(entry.piece, entry.count * fit.count * outer)
  }
  for (const [name, piece] of set.pieces) if (piece.make !== null) counts.set(name, piece.make)
  return counts
}

/** Judges one fit with another paper for the pieces it brings together. */
function tryPaper(set: TemplateSet, base: ModelOptions, fit: Fit, stock: string): PaperTrial {
  const involved = new Set([...fit.put.map((entry) => entry.piece), fit.to])
  const model = modelSet(set, {
    ...base,
    replaceStock: (piece) => (involved.has(piece.name) && isCutFromPaper(piece) ? stock : base.replaceStock(piece)),
  })
  return { stock, judged: judgeFit(model, fit) }
}

/** Folds and judges a whole set. */
export function judgeSet(set: TemplateSet, options: CheckOptions): JudgedSet {
  const base = modelOptionsOf(set, options)
  const model = modelSet(set, base)
  const fits = set.fits.map((fit) =>
    fit.workmanship === null || options.workmanship !== undefined
      ? judgeFit(model, fit)
      : judgeFit(modelSet(set, { ...base, workmanship: fit.workmanship }), fit),
  )
  // Whether the whole set closes is asked of one class of makers, so that what is shared is the same thing throughout.
  const whole = fits.map((judged) => (judged.fit.workmanship === null ? judged : judgeFit(model, judged.fit)))
  return {
    set,
    options,
    workmanship: base.workmanship,
    model,
    pieces: new Map([...set.pieces.keys()].map((name) => [name, model.folded(name)])),
    fits,
    papers: new Map(set.fits.map((fit) => [fit.id, fit.papers.map((stock) => tryPaper(set, base, fit, stock))])),
    makes: countPieces(set),
    works: jointProbability(whole.flatMap((judged) => judged.conditions)),
  }
}
