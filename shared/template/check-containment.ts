import type { PieceGiven } from '../pieces/given.ts'
import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import type { Fit } from './template-model.ts'

interface Containment {
  readonly inner: string
  readonly outer: string
  readonly path: Path
}

/** What a fit puts inside what. A lid goes over a base and a band around it: what is named is inside. */
function containmentsOf(fit: Fit): readonly Containment[] {
  const path = ['fits', fit.id]
  const put = fit.put.map(({ piece }) =>
    fit.relation === 'in' ? { inner: piece, outer: fit.to, path } : { inner: fit.to, outer: piece, path },
  )
  const held =
    fit.holding === null ? [] : fit.put.map(({ piece }) => ({ inner: fit.holding ?? '', outer: piece, path }))
  return [...put, ...held]
}

const wrappingsOf = (pieces: ReadonlyMap<string, PieceGiven>): readonly Containment[] =>
  [...pieces.values()].flatMap((piece) =>
    (piece.kind === 'band' || piece.kind === 'sleeve') && piece.around !== null
      ? [{ inner: piece.around, outer: piece.name, path: ['pieces', piece.name, 'around'] }]
      : [],
  )

/** The way from a piece outwards to another, both included; `null` where there is none. */
function wayOut(from: string, to: string, outerOf: ReadonlyMap<string, ReadonlySet<string>>): readonly string[] | null {
  const cameFrom = new Map<string, string | null>([[from, null]])
  const queue = [from]
  for (let piece = queue.pop(); piece !== undefined; piece = queue.pop()) {
    if (piece === to) {
      const way: string[] = []
      for (let step: string | null = to; step !== null; step = cameFrom.get(step) ?? null) way.unshift(step)
      return way
    }
    for (const outer of outerOf.get(piece) ?? []) {
      if (cameFrom.has(outer)) continue
      cameFrom.set(outer, piece)
      queue.push(outer)
    }
  }
  return null
}

/** Fits looked through for a way round: no set has so many, and each look takes time in proportion. */
const mostLooked = 2000

/** Reports pieces that would have to be inside themselves, at the fit that closes the round. */
export function checkContainment(
  pieces: ReadonlyMap<string, PieceGiven>,
  fits: readonly Fit[],
  report: ReportProblem,
): void {
  const outerOf = new Map<string, Set<string>>()
  const all = [...wrappingsOf(pieces), ...fits.flatMap(containmentsOf)].filter(
    ({ inner, outer }) => inner !== '' && outer !== '',
  )
  for (const { inner, outer, path } of all.slice(0, mostLooked)) {
    const way = wayOut(outer, inner, outerOf)
    if (way !== null) {
      const words =
        way.length < 2
          ? `“${inner}” would have to be inside itself.`
          : `This puts ${[inner, ...way].map((piece) => `“${piece}”`).join(' inside ')}.`
      report(
        path,
        'containment-cycle',
        words,
        'Take out the fit that is not meant, or name another piece in it.',
        'key',
      )
      continue
    }
    outerOf.set(inner, (outerOf.get(inner) ?? new Set()).add(outer))
  }
}
