import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { areaOf, perimeterOf, signedAreaOf } from '../../../shared/geometry/area.ts'
import { boundsOf } from '../../../shared/geometry/bounds.ts'
import { clipToConvex, clipToHalfPlane, isConvex } from '../../../shared/geometry/clip-convex.ts'
import { coveredArea, differenceOf, intersectionOf, sharedArea, unionOf } from '../../../shared/geometry/combine.ts'
import { containsPoint } from '../../../shared/geometry/contains-point.ts'
import { crossingsOf, isSimple } from '../../../shared/geometry/crossings.ts'
import { point, rectangle } from '../../../shared/geometry/rectangle.ts'
import { arcPoints, roundCorners } from '../../../shared/geometry/round-corner.ts'
import type { Polygon } from '../../../shared/geometry/shapes.ts'
import { mirrorAcross, movePolygon, reflection, rotation, translation } from '../../../shared/geometry/transform.ts'

const coordinate = fc.double({ min: -500, max: 500, noNaN: true })
const anyPoint = fc.record({ x: coordinate, y: coordinate })

/** A convex outline: points in order of angle on an ellipse. */
const convex: fc.Arbitrary<Polygon> = fc
  .record({
    angles: fc.uniqueArray(fc.integer({ min: 0, max: 359 }), { minLength: 3, maxLength: 9 }),
    a: fc.double({ min: 5, max: 200, noNaN: true }),
    b: fc.double({ min: 5, max: 200, noNaN: true }),
    x: coordinate,
    y: coordinate,
  })
  .map(({ angles, a, b, x, y }) =>
    [...angles]
      .sort((one, other) => one - other)
      .map((degrees) => {
        const angle = (degrees * Math.PI) / 180
        return point(x + a * Math.cos(angle), y + b * Math.sin(angle))
      }),
  )

describe('reflecting in a line', () => {
  it('takes (7, 3) over the line from (2, 1) to (5, 5) to (2.52, 6.36)', () => {
    const moved = reflection({ from: point(2, 1), to: point(5, 5) }).point(point(7, 3))
    expect(moved.x).toBeCloseTo(2.52, 10)
    expect(moved.y).toBeCloseTo(6.36, 10)
  })

  it('comes back when done twice', () => {
    fc.assert(
      fc.property(anyPoint, anyPoint, anyPoint, (p, from, to) => {
        fc.pre(Math.hypot(to.x - from.x, to.y - from.y) > 1)
        const over = reflection({ from, to })
        const back = over.point(over.point(p))
        expect(Math.hypot(back.x - p.x, back.y - p.y)).toBeLessThan(1e-6)
      }),
    )
  })
})

describe('areas', () => {
  it('does not change when a shape is moved, turned or mirrored', () => {
    fc.assert(
      fc.property(convex, anyPoint, fc.double({ min: 0, max: 360, noNaN: true }), (shape, by, turn) => {
        const area = areaOf(shape)
        for (const move of [translation(by.x, by.y), rotation(turn), mirrorAcross]) {
          const moved = movePolygon(shape, move)
          expect(Math.abs(areaOf(moved) - area)).toBeLessThan(1e-7 * Math.max(1, area))
          expect(signedAreaOf(moved)).toBeGreaterThanOrEqual(0)
          expect(perimeterOf(moved)).toBeCloseTo(perimeterOf(shape), 6)
        }
      }),
    )
  })

  it('turns a quarter exactly', () => {
    expect(rotation(90).point(point(3, 2))).toEqual({ x: -2, y: 3 })
  })
})

describe('clipping', () => {
  it('finds the same shared area as a general polygon clipper', () => {
    fc.assert(
      fc.property(convex, convex, (first, second) => {
        const own = areaOf(clipToConvex(first, second))
        const union = coveredArea(unionOf([first, second]))
        expect(Math.abs(areaOf(first) + areaOf(second) - union - own)).toBeLessThan(1e-4)
      }),
    )
  })

  it('keeps everything on one side and the rest on the other', () => {
    fc.assert(
      fc.property(convex, anyPoint, anyPoint, (shape, a, b) => {
        fc.pre(Math.hypot(a.x - b.x, a.y - b.y) > 1)
        const sum = areaOf(clipToHalfPlane(shape, a, b)) + areaOf(clipToHalfPlane(shape, b, a))
        expect(Math.abs(sum - areaOf(shape))).toBeLessThan(1e-6)
      }),
    )
  })

  it('cuts shapes that are not convex to a ten-thousandth of a square millimetre', () => {
    const notched = [point(0, 0), point(100, 0), point(50, 30), point(100, 100), point(0, 100)]
    expect(isConvex(notched)).toBe(false)
    expect(sharedArea(notched, rectangle(0, 0, 50, 100))).toBeCloseTo(5000, 4)
    expect(coveredArea(differenceOf(notched, [rectangle(0, 0, 50, 100)]))).toBeCloseTo(areaOf(notched) - 5000, 4)
    expect(intersectionOf(notched, rectangle(200, 200, 300, 300))).toEqual([])
  })
})

describe('outlines', () => {
  it('calls a bow tie crossed and names where', () => {
    const tie = [point(0, 0), point(10, 10), point(10, 0), point(0, 10)]
    expect(crossingsOf(tie)).toEqual([{ x: 5, y: 5 }])
  })

  it('calls an outline that touches itself or turns back on itself not simple', () => {
    expect(isSimple([point(0, 0), point(10, 0), point(10, 10), point(5, 0), point(0, 10)])).toBe(false)
    expect(isSimple([point(0, 0), point(10, 0), point(5, 0), point(5, 8)])).toBe(false)
    expect(isSimple([point(0, 0), point(10, 0), point(10, 10), point(0, 10)])).toBe(true)
  })

  it('calls every convex outline simple', () => {
    fc.assert(fc.property(convex, (shape) => isSimple(shape)))
  })

  it('holds its own middle and edge, and no point outside its bounds', () => {
    fc.assert(
      fc.property(convex, (shape) => {
        const middle = {
          x: shape.reduce((sum, p) => sum + p.x, 0) / shape.length,
          y: shape.reduce((sum, p) => sum + p.y, 0) / shape.length,
        }
        const bounds = boundsOf(shape)
        expect(containsPoint(shape, middle)).toBe(true)
        expect(shape.every((corner) => containsPoint(shape, corner))).toBe(true)
        expect(containsPoint(shape, point(bounds.right + 1, middle.y))).toBe(false)
      }),
    )
  })
})

describe('rounded corners', () => {
  it('stay within a hundredth of a millimetre of the arc', () => {
    const arc = arcPoints(point(0, 0), 40, 0, Math.PI / 2)
    arc.slice(1).forEach((here, index) => {
      const before = arc[index] ?? here
      const middle = Math.hypot((here.x + before.x) / 2, (here.y + before.y) / 2)
      expect(40 - middle).toBeLessThan(0.01)
      expect(Math.hypot(here.x, here.y)).toBeCloseTo(40, 9)
    })
  })

  it('take r²(4 − π) from a rectangle', () => {
    const rounded = roundCorners(rectangle(0, 0, 100, 60), 5)
    expect(areaOf(rounded)).toBeCloseTo(6000 - 25 * (4 - Math.PI), 0)
    expect(isSimple(rounded)).toBe(true)
    const { left, bottom, right, top } = boundsOf(rounded)
    expect(left).toBeCloseTo(0, 12)
    expect(bottom).toBeCloseTo(0, 12)
    expect(right).toBeCloseTo(100, 12)
    expect(top).toBeCloseTo(60, 12)
  })

  it('shrink where an edge is too short for them', () => {
    expect(isSimple(roundCorners(rectangle(0, 0, 4, 4), 30))).toBe(true)
  })
})
