import { differenceD, FillRule, intersectD, type PathsD, unionD } from 'clipper2-ts'
import { areaOf, signedAreaOf } from './area.ts'
import { clipToConvex, isConvex } from './clip-convex.ts'
import type { Polygon } from './shapes.ts'

/** Decimals of a millimetre that clipping keeps. */
const decimals = 8

const pathsOf = (polygons: readonly Polygon[]): PathsD =>
  polygons.map((polygon) => polygon.map(({ x, y }) => ({ x, y })))
const polygonsOf = (paths: PathsD): readonly Polygon[] => paths.map((path) => path.map(({ x, y }) => ({ x, y })))

/** What two outlines share: no, one or several outlines; holes run clockwise. */
export function intersectionOf(first: Polygon, second: Polygon): readonly Polygon[] {
  if (isConvex(first) && isConvex(second)) {
    const shared = clipToConvex(first, second)
    return shared.length === 0 ? [] : [shared]
  }
  return polygonsOf(intersectD(pathsOf([first]), pathsOf([second]), FillRule.NonZero, decimals))
}

/** What several outlines cover together; holes run clockwise. */
export const unionOf = (polygons: readonly Polygon[]): readonly Polygon[] =>
  polygonsOf(unionD(pathsOf(polygons), [], FillRule.NonZero, decimals))

/** What is left of an outline once others are taken from it; holes run clockwise. */
export const differenceOf = (polygon: Polygon, taken: readonly Polygon[]): readonly Polygon[] =>
  polygonsOf(differenceD(pathsOf([polygon]), pathsOf(taken), FillRule.NonZero, decimals))

/** Area that several outlines cover, holes taken off, in square millimetres. */
export const coveredArea = (polygons: readonly Polygon[]): number =>
  Math.abs(polygons.reduce((total, polygon) => total + signedAreaOf(polygon), 0))

/** Area that two outlines share, in square millimetres. */
export const sharedArea = (first: Polygon, second: Polygon): number => {
  const shared = intersectionOf(first, second)
  return shared.length === 1 ? areaOf(shared[0] ?? []) : coveredArea(shared)
}
