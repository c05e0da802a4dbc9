import { areaOf } from '../geometry/area.ts'
import { edgesOf } from '../geometry/contains-point.ts'
import type { Polygon, Segment } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'

/**
 * Parallel strokes across an outline, at 45 degrees unless turned, by even-odd crossings: works for any closed outline.
 * @param spacing between strokes, measured across them; narrowed for a small area so that at least three strokes show
 */
export function hatch(polygon: Polygon, spacing: Millimetres, degrees = 45): readonly Segment[] {
  const angle = (degrees * Math.PI) / 180
  const [c, s] = [Math.cos(angle), Math.sin(angle)]
  const along = (x: number, y: number): number => c * x + s * y
  const across = (x: number, y: number): number => c * y - s * x
  const offsets = polygon.map((p) => across(p.x, p.y))
  const low = Math.min(...offsets)
  const high = Math.max(...offsets)
  if (!(areaOf(polygon) > 0)) return []
  const step = Math.min(spacing, (high - low) / 4)
  const strokes: Segment[] = []
  for (let offset = low + step / 2; offset < high; offset += step) {
    const crossings = edgesOf(polygon)
      .flatMap(({ from, to }) => {
        const a = across(from.x, from.y) - offset
        const b = across(to.x, to.y) - offset
        if (a > 0 === b > 0) return []
        const share = a / (a - b)
        return [along(from.x + share * (to.x - from.x), from.y + share * (to.y - from.y))]
      })
      .sort((one, other) => one - other)
    for (let index = 0; index + 1 < crossings.length; index += 2) {
      const [start, end] = [crossings[index] ?? 0, crossings[index + 1] ?? 0]
      if (end - start < 0.2) continue
      const at = (distance: number) => ({ x: c * distance - s * offset, y: s * distance + c * offset })
      strokes.push({ from: at(start), to: at(end) })
    }
  }
  return strokes
}
