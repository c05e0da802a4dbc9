import type { Point, Segment } from '../geometry/shapes.ts'
import type { Blank } from '../pieces/blank.ts'

/** A blank drawn smaller or larger; its measures keep the lengths they stand for. */
export function scaleBlank(blank: Blank, scale: number): Blank {
  const point = ({ x, y }: Point): Point => ({ x: x * scale, y: y * scale })
  const line = <T extends Segment>(segment: T): T => ({ ...segment, from: point(segment.from), to: point(segment.to) })
  return {
    ...blank,
    outline: blank.outline.map(point),
    holes: blank.holes.map((hole) => hole.map(point)),
    scores: blank.scores.map(line),
    cuts: blank.cuts.map(line),
    perforations: blank.perforations.map(line),
    areas: blank.areas.map((area) => ({ ...area, polygon: area.polygon.map(point) })),
    measures: blank.measures.map(line),
  }
}
