import type { Point, Segment } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'

/** The dashes of a pattern laid along a path as pieces of their own, for machines that draw no patterns. A dot is drawn as long as it is wide. */
export function dashLine(points: readonly Point[], dash: readonly Millimetres[], dot: Millimetres): readonly Segment[] {
  if (dash.length === 0) return points.slice(1).map((to, index) => ({ from: points[index] ?? to, to }))
  const made: Segment[] = []
  let part = 0
  let left = dash[0] === 0 ? dot : (dash[0] ?? 0)
  points.slice(1).forEach((to, index) => {
    const from = points[index] ?? to
    const length = Math.hypot(to.x - from.x, to.y - from.y)
    if (length === 0) return
    const at = (distance: number): Point => ({
      x: from.x + ((to.x - from.x) * distance) / length,
      y: from.y + ((to.y - from.y) * distance) / length,
    })
    let done = 0
    while (done < length - 1e-9) {
      const step = Math.min(left, length - done)
      if (part % 2 === 0) made.push({ from: at(done), to: at(done + step) })
      done += step
      left -= step
      if (left <= 1e-9) {
        part += 1
        const next = dash[part % dash.length] ?? 0
        left = part % 2 === 0 ? Math.max(next, next === 0 ? dot : next) : Math.max(1e-3, next)
      }
    }
  })
  return made
}
