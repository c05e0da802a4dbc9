import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { areaOf, signedAreaOf } from '../../../shared/geometry/area.ts'
import { boundsOf } from '../../../shared/geometry/bounds.ts'
import { containsPoint } from '../../../shared/geometry/contains-point.ts'
import { isSimple } from '../../../shared/geometry/crossings.ts'
import { checkBlank } from '../../../shared/pieces/check-blank.ts'
import { drawPiece } from '../../../shared/pieces/draw-registry.ts'
import type { PieceGiven } from '../../../shared/pieces/given.ts'
import { aBaronial, aBaronialByCorners, aBox, aCard, aCustom, foldGiven } from '../../support/given-pieces.ts'
import { validBag, validBox, validPiece, validSleeve, validSquareFlap } from '../../support/valid-pieces.ts'

describe('every sheet of every valid piece', () => {
  it('is closed, does not cross itself and lies with its lower left at the origin', () => {
    fc.assert(
      fc.property(validPiece, (given) => {
        const blanks = drawPiece('piece', foldGiven(given), () => 'long')
        expect(blanks.length).toBeGreaterThan(0)
        for (const blank of blanks) {
          expect(isSimple(blank.outline), blank.name).toBe(true)
          expect(signedAreaOf(blank.outline)).toBeGreaterThan(0)
          const { left, bottom } = boundsOf(blank.outline)
          expect(left).toBeCloseTo(0, 9)
          expect(bottom).toBeCloseTo(0, 9)
        }
      }),
      { numRuns: 300 },
    )
  })

  it('has its scores, areas and measures on it', () => {
    fc.assert(
      fc.property(validPiece, (given) => {
        for (const blank of drawPiece('piece', foldGiven(given))) {
          for (const { from, to, name } of blank.scores) {
            expect(Math.hypot(to.x - from.x, to.y - from.y), name).toBeGreaterThan(0.1)
            expect(containsPoint(blank.outline, from, 1e-5), name).toBe(true)
            expect(containsPoint(blank.outline, to, 1e-5), name).toBe(true)
          }
          const bounds = boundsOf(blank.outline)
          for (const { polygon, name } of blank.areas) {
            const part = boundsOf(polygon)
            expect(part.left, name).toBeGreaterThanOrEqual(bounds.left - 1e-6)
            expect(part.right, name).toBeLessThanOrEqual(bounds.right + 1e-6)
          }
          for (const { from, to, length } of blank.measures) {
            expect(length).toBeCloseTo(Math.hypot(to.x - from.x, to.y - from.y), 9)
          }
        }
      }),
      { numRuns: 300 },
    )
  })

  it('keeps every geometric fact of its kind but the width of shown flaps', () => {
    fc.assert(
      fc.property(fc.oneof(validBox, validSleeve, validBag, validSquareFlap), (given) => {
        const piece = foldGiven(given)
        const broken = checkBlank(piece, drawPiece('piece', piece)).filter((fact) => !fact.holds)
        const isAllowed = broken.every((fact) => ['tab-too-long', 'tabs-collide', 'back-open'].includes(fact.fact))
        expect(isAllowed, JSON.stringify(broken)).toBe(true)
      }),
    )
  })
})

describe('a box', () => {
  it('has the area of its sheet less what is cut out at the corners', () => {
    const piece = foldGiven(aBox())
    const [blank] = drawPiece('base', piece)
    // Tabs 20 long on walls 20 deep: 1 mm trimmed and two wedges of 20·tan 5° each.
    const cutOut = 4 * (1 * 20 + 20 * 20 * Math.tan((5 * Math.PI) / 180))
    expect(areaOf(blank?.outline ?? [])).toBeCloseTo(200 * 158 - cutOut, 6)
  })

  it('keeps all of its sheet where tabs have neither trim nor taper, and names four slits', () => {
    const piece = foldGiven(aBox({ tabs: { at: 'sides', glued: 'inside', trim: 0, taper: 0 } }))
    const [blank] = drawPiece('base', piece)
    expect(areaOf(blank?.outline ?? [])).toBeCloseTo(200 * 158, 9)
    expect(blank?.cuts).toHaveLength(4)
    for (const cut of blank?.cuts ?? [])
      expect(Math.hypot(cut.to.x - cut.from.x, cut.to.y - cut.from.y)).toBeCloseTo(20, 9)
  })

  it('loses two half discs to its thumb notches', () => {
    const plain = drawPiece('base', foldGiven(aBox()))[0]
    const notched = drawPiece('base', foldGiven(aBox({ thumbNotch: true })))[0]
    const lost = areaOf(plain?.outline ?? []) - areaOf(notched?.outline ?? [])
    expect(lost).toBeGreaterThan(0.99 * Math.PI * 100)
    expect(lost).toBeLessThanOrEqual(Math.PI * 100)
  })

  it('has its tabs on the walls its author asked for', () => {
    const ends = drawPiece('base', foldGiven(aBox()))[0]
    const tabScores = ends?.scores.filter((line) => line.name.startsWith('tab')) ?? []
    expect(tabScores).toHaveLength(4)
    for (const line of tabScores) expect(line.from.y).toBeCloseTo(line.to.y, 9)
    const sides = drawPiece('base', foldGiven(aBox({ tabs: { at: 'sides', glued: 'inside', trim: 1, taper: 5 } })))[0]
    for (const line of sides?.scores.filter((one) => one.name.startsWith('tab')) ?? [])
      expect(line.from.x).toBeCloseTo(line.to.x, 9)
  })

  it('comes with four strips where its walls are doubled and a sheet where it is covered', () => {
    const names = drawPiece('base', foldGiven(aBox({ walls: 'doubled', covered: 'wrap' }))).map((blank) => blank.name)
    expect(names).toEqual([
      'base',
      'base/side wall lining 1',
      'base/side wall lining 2',
      'base/end wall lining 1',
      'base/end wall lining 2',
      'base/cover',
    ])
  })
})

describe('what is broken shows', () => {
  const broken = (given: PieceGiven) => {
    const piece = foldGiven(given, 0.35)
    return checkBlank(piece, drawPiece('piece', piece)).filter((fact) => !fact.holds)
  }
  const boxOf = (scoredLength: number, scoredWidth: number, wall: number) =>
    aBox({
      by: {
        given: 'blank',
        blank: { length: scoredLength + 2 * wall, width: scoredWidth + 2 * wall },
        wall: { length: [wall, wall], width: [wall, wall] },
      },
    })

  it('names tabs of 34 that overlap by 8.35 on a wall 59.65 long inside', () => {
    const collision = broken(boxOf(60, 50, 34)).filter((fact) => fact.fact === 'tabs-collide')
    expect(collision).toHaveLength(2)
    for (const fact of collision) expect(fact.measured - fact.limit).toBeCloseTo(8.35, 6)
    expect(broken(boxOf(150, 112, 34)).filter((fact) => fact.fact === 'tabs-collide')).toEqual([])
  })

  it('names walls deeper than the sheet allows', () => {
    expect(broken(boxOf(80, -5, 40)).map((fact) => fact.fact)).toContain('wall-too-deep')
  })

  it('names a tab taller than the wall it is glued to', () => {
    const found = broken(
      aBox({ by: { given: 'blank', blank: { length: 210, width: 158 }, wall: { length: [25, 25], width: [20, 20] } } }),
    )
    expect(found).toEqual([expect.objectContaining({ fact: 'tab-too-long', measured: 25, limit: 20 })])
  })

  it('names flaps that poke out of a long narrow pocket', () => {
    const found = broken(
      aBaronial({ pocket: { length: 200, width: 60 }, seam: { bottom: 5 * Math.SQRT2, top: 5 * Math.SQRT2 } }),
    )
    const shows = found.filter((fact) => fact.fact === 'flap-shows')
    expect(shows.map((fact) => fact.part)).toEqual(['bottom flap', 'seal flap'])
    expect(shows[0]?.measured).toBeCloseTo(45, 6)
  })

  it('names a narrow seam, and folds that leave the back open', () => {
    expect(broken(aBaronial({ seam: { bottom: 5, top: 12 } })).map((fact) => fact.fact)).toEqual(['seam-narrow'])
    // Folds that cross outside the square are refused when a piece is folded; a form that lacks its corners is measured.
    const folded = foldGiven(aBaronialByCorners())
    const corners = { left: 60, right: 60, bottom: 60, flap: 60 }
    if (folded.form.kind !== 'envelope' || folded.form.style !== 'baronial') throw new Error('not a baronial')
    const seam = { bottom: 120 - 150, top: 120 - 150 }
    const piece = { ...folded, form: { ...folded.form, square: 150, corners, seam } }
    const open = checkBlank(piece, drawPiece('piece', piece)).filter((fact) => !fact.holds)
    expect(open.map((fact) => fact.fact)).toEqual(expect.arrayContaining(['flap-short', 'back-open', 'seam-narrow']))
  })

  it('names a folded-in panel that is not shorter than the one it lies in', () => {
    const found = broken(aCard({ style: 'roll', panels: 3, panelWidths: [100, 100, 99.5] }))
    expect(found).toEqual([expect.objectContaining({ fact: 'inner-panel', part: 'panel 3' })])
    expect(broken(aCard({ style: 'roll', panels: 3, panelWidths: [100, 100, 99] }))).toEqual([])
  })

  it('names an outline that crosses itself and a score that leaves the sheet', () => {
    const tie = [
      { x: 0, y: 0 },
      { x: 100, y: 100 },
      { x: 100, y: 0 },
      { x: 0, y: 100 },
    ]
    expect(broken(aCustom({ outline: tie, scores: [] })).map((fact) => fact.fact)).toEqual(['outline'])
    const stray = { from: { x: 0, y: 40 }, to: { x: 90, y: 40 }, fold: 'valley', angle: 90 } as const
    expect(broken(aCustom({ scores: [stray] })).map((fact) => fact.fact)).toEqual(['score-outside'])
  })
})

describe('grain', () => {
  it('runs along the folded length where the stock is long grain, on every sheet of the piece', () => {
    const grainOf = () => 'long' as const
    expect(drawPiece('card', foldGiven(aCard()), grainOf)[0]?.grain).toBe('y')
    expect(drawPiece('card', foldGiven(aCard({ fold: 'short-edge' })), grainOf)[0]?.grain).toBe('x')
    expect(drawPiece('base', foldGiven(aBox()), grainOf)[0]?.grain).toBe('x')
    expect(drawPiece('base', foldGiven(aBox()))[0]?.grain).toBeNull()
  })
})
