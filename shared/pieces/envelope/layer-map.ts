import { areaOf, perimeterOf, signedAreaOf } from '../../geometry/area.ts'
import { clipToConvex, isConvex } from '../../geometry/clip-convex.ts'
import type { Polygon } from '../../geometry/shapes.ts'
import { samePoint } from '../../geometry/tolerance.ts'
import type { LayerMap } from '../folded-piece.ts'

/** The part of an outline that lies under a folded flap, as outlines. */
export type Clip = (polygon: Polygon, flap: Polygon) => readonly Polygon[]

/** Clipping for convex flaps, which every envelope of the model has: exact and quick. */
const clipConvexFlap: Clip = (polygon, flap) => {
  if (!isConvex(flap)) throw new RangeError('a flap that is not convex needs a clip of its own')
  const kept = clipToConvex(polygon, flap)
  return kept.length === 0 ? [] : [kept]
}

const regionArea = (region: readonly Polygon[]): number =>
  Math.abs(region.reduce((total, polygon) => total + signedAreaOf(polygon), 0))

/**
 * Share of the pocket under each number of layers: entry n is the share with exactly n layers, the face counted.
 * Areas that every group of flaps shares are found by clipping, and the parts under exactly k flaps follow by
 * inclusion and exclusion: E_k = Σ_{j≥k} (−1)^(j−k)·C(j,k)·S_j (derived).
 * @param pocket convex, counter-clockwise; @param foldedFlaps as they lie over it once folded
 * @param clip for flaps that are not convex
 */
export function layerShares(
  pocket: Polygon,
  foldedFlaps: readonly Polygon[],
  clip: Clip = clipConvexFlap,
): readonly number[] {
  const count = foldedFlaps.length
  const sums = new Array<number>(count + 1).fill(0)
  const total = areaOf(pocket)
  sums[0] = total
  const least = samePoint * samePoint
  const visit = (region: readonly Polygon[], from: number, depth: number): void => {
    for (let index = from; index < count; index += 1) {
      const flap = foldedFlaps[index]
      if (flap === undefined) continue
      const shared = region.flatMap((polygon) => clip(polygon, flap))
      const area = regionArea(shared)
      if (area <= least) continue
      sums[depth + 1] = (sums[depth + 1] ?? 0) + area
      visit(shared, index + 1, depth + 1)
    }
  }
  visit([pocket], 0, 0)
  return [
    0,
    ...sums.map((_, exactly) => {
      let area = 0
      let choose = 1
      for (let among = exactly; among <= count; among += 1) {
        area += (among - exactly) % 2 === 0 ? choose * (sums[among] ?? 0) : -choose * (sums[among] ?? 0)
        choose = (choose * (among + 1)) / (among + 1 - exactly)
      }
      return total > 0 ? Math.max(0, area / total) : 0
    }),
  ]
}

/**
 * Layers of paper over the pocket: fewest, mean (1 + flap areas inside the pocket ÷ its area, exact), most.
 * A part narrower than rounding does not count.
 */
export function layerMap(pocket: Polygon, foldedFlaps: readonly Polygon[], clip: Clip = clipConvexFlap): LayerMap {
  const shares = layerShares(pocket, foldedFlaps, clip)
  const area = areaOf(pocket)
  const least = area > 0 ? (samePoint * perimeterOf(pocket)) / area : 0
  const present = shares.flatMap((share, layers) => (share > least ? [layers] : []))
  return {
    min: present[0] ?? 1,
    mean: shares.reduce((mean, share, layers) => mean + layers * share, 0),
    max: present.at(-1) ?? 1,
  }
}

/** Area of the pocket that no flap covers: a hole in the back, in square millimetres. */
export function openBack(pocket: Polygon, foldedFlaps: readonly Polygon[]): number {
  const area = (layerShares(pocket, foldedFlaps)[1] ?? 0) * areaOf(pocket)
  return area <= samePoint * perimeterOf(pocket) ? 0 : area
}

/** Area by which a folded flap lies outside the pocket, in square millimetres. */
export function protrudingArea(pocket: Polygon, foldedFlap: Polygon): number {
  const inside = regionArea(clipConvexFlap(foldedFlap, pocket))
  const outside = areaOf(foldedFlap) - inside
  return outside <= samePoint * perimeterOf(foldedFlap) ? 0 : outside
}

/** Area glued between two folded flaps, in square millimetres. */
export const gluedArea = (first: Polygon, second: Polygon): number => regionArea(clipConvexFlap(first, second))
