import { describe, expect, it } from 'vitest'
import type { PieceGiven } from '../../../shared/pieces/given.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import { emptyWorkspace } from '../../../shared/template/read-workspace.ts'
import type { TemplateSet } from '../../../shared/template/template-model.ts'
import { exampleText, exampleWorkspace, onePiece, soundSet } from './support.ts'

const piece = (set: TemplateSet, name: string): PieceGiven => {
  const found = set.pieces.get(name)
  if (found === undefined) throw new Error(`no piece ${name}`)
  return found
}

describe('the example set of the language', () => {
  const set = soundSet(exampleText('orchard-notes'), exampleWorkspace())

  it('is read without a problem', () => {
    expect(set).toMatchObject({
      name: 'orchard-notes',
      title: 'Orchard notes, six cards in a box',
      family: 'orchard',
      sheet: { length: 420, width: 297, name: '420 x 297' },
      mail: 'usps-letter',
      steps: 'auto',
    })
  })

  it('has its pieces in the order of the file, with lengths in millimetres', () => {
    expect([...set.pieces.keys()]).toEqual(['card', 'envelope', 'base', 'lid', 'band'])
    expect(piece(set, 'card')).toMatchObject({ folded: { length: 148, width: 105 }, fold: 'long-edge', panels: 2 })
    expect(piece(set, 'lid')).toMatchObject({
      by: { blank: { length: 190.5, width: 149 }, wall: { length: [14, 14], width: [14, 14] } },
    })
  })

  it('fills in what its author left out', () => {
    expect(piece(set, 'lid')).toMatchObject({
      made: 'measured',
      scored: 'turning',
      make: null,
      corner: 0,
      tabs: { at: 'ends', glued: 'inside', trim: 1, taper: 5 },
      walls: 'single',
      thumbNotch: false,
    })
    expect(piece(set, 'envelope')).toMatchObject({ seam: { bottom: 12, top: 12 }, liner: null })
  })

  it('has its fits with the clearances they name', () => {
    expect(set.fits.map(({ id, relation, to, count, holding }) => ({ id, relation, to, count, holding }))).toEqual([
      { id: 'card-in-envelope', relation: 'in', to: 'envelope', count: 1, holding: null },
      { id: 'pack-in-base', relation: 'in', to: 'base', count: 6, holding: 'card' },
      { id: 'lid-on-base', relation: 'over', to: 'base', count: 1, holding: null },
      { id: 'band-on-box', relation: 'around', to: 'lid', count: 1, holding: null },
    ])
    expect(set.fits[2]?.clearance).toEqual({
      name: 'slip-lid',
      length: { min: 0.2, max: 3 },
      width: { min: 0.2, max: 3 },
      depth: null,
      headspace: { min: 0.5, max: null },
      overlap: null,
      strict: false,
    })
  })

  it('has its waivers', () => {
    expect(set.waivers).toEqual([
      {
        rule: 'ruler/off-grid',
        subject: 'envelope',
        reason: 'template is traced, not measured',
        until: '2027-03-31',
        index: 0,
      },
    ])
  })
})

describe('a set with every form of the language', () => {
  const reading = readSet(exampleText('every-form'), 'every-form.yaml', emptyWorkspace())
  const set = soundSet(exampleText('every-form'))

  it('is read without a problem', () => {
    expect(reading.problems).toEqual([])
    expect(set.pieces.size).toBe(30)
    expect(set.fits).toHaveLength(5)
  })

  it('lists every size that is left to sizing, and no other', () => {
    expect(reading.open.map((path) => path.join('.'))).toEqual([
      'pieces.plain.pocket',
      'pieces.usual.pocket',
      'pieces.lid.blank',
      'pieces.lid.wall',
      'pieces.open-tray.inside',
      'pieces.free-tube.blank',
      'pieces.open-bag.inside',
      'pieces.leaf.size',
    ])
  })

  it('reads calipers in all their forms', () => {
    const caliper = (name: string) => {
      const stock = set.tokens.stocks.get(name)
      return [stock?.caliper, stock?.caliperHalfWidth, stock?.grammage]
    }
    expect(caliper('smooth')).toEqual([0.32, null, 270])
    expect(caliper('pearl')[0]).toBeCloseTo(0.3302, 10)
    expect(caliper('pearl')[1]).toBeCloseTo(0.01651, 10)
    expect(caliper('kraft')).toEqual([0.37, 0.02, null])
    expect(caliper('vellum')[0]).toBeCloseTo(0.38, 10)
    expect(caliper('unknown')).toEqual([null, null, 120])
  })

  it('places what is glued on a card from its centre, on the front or inside', () => {
    expect(piece(set, 'card')).toMatchObject({
      raised: { nominal: 0.8, halfWidth: 0.2 },
      raisedToEdge: true,
      layers: [
        { side: 'front', at: { x: 0, y: 0 }, banner: null },
        { side: 'inside', at: { x: 0, y: 0 } },
        { side: 'inside', at: { x: -12.7, y: 0 }, banner: { depth: 6.35, point: 'in' } },
      ],
      insert: { stock: 'kraft', loose: true, folded: true },
      pocket: { depth: 50.8, side: 6.35 },
    })
  })

  it('knows how many panels a style of folding has', () => {
    expect(
      ['flat', 'roll', 'strip', 'gate', 'card'].map((name) => (piece(set, name) as { panels?: number }).panels),
    ).toEqual([1, 4, 3, 3, 2])
  })

  it('reads the three ways of giving an envelope', () => {
    expect(piece(set, 'pointed')).toMatchObject({ by: 'pocket', seam: { bottom: 12, top: 15 }, liner: 'vellum' })
    expect(piece(set, 'cornered')).toMatchObject({
      by: 'corners',
      square: 210,
      corners: { left: 101, right: 100, bottom: 126, flap: 126 },
    })
    expect(piece(set, 'square')).toMatchObject({ style: 'square-flap', back: 100, sideFlap: 15, flap: 45 })
    expect(piece(set, 'usual')).toMatchObject({ pocket: 'fit', back: null, sideFlap: null, flap: null })
  })

  it('reads walls one by one or in pairs', () => {
    expect(piece(set, 'base')).toMatchObject({
      by: { wall: { length: [20, 21], width: [22, 22] } },
      covered: 'kraft',
      thumbNotch: true,
    })
  })

  it('reads what goes round something, by what it goes round or by its blank', () => {
    expect(piece(set, 'tube')).toMatchObject({ around: 'base', girth: 'length', overlap: 12.7, blank: null })
    expect(piece(set, 'scored-tube')).toMatchObject({ blank: { length: 300, width: 60, scores: [80, 100, 180, 200] } })
    expect(piece(set, 'cut-band')).toMatchObject({ width: 40, blank: { length: 420, scores: [10, 20] } })
    expect(piece(set, 'long-band')).toMatchObject({ width: 40, blank: { length: 420, scores: [] } })
    expect(piece(set, 'ribbon')).toMatchObject({ ribbon: true, stock: null, tie: 'knot', blank: null })
  })

  it('reckons the inside of a bag from its scores', () => {
    expect(piece(set, 'scored-bag')).toMatchObject({ inside: { width: 180, depth: 80, height: 220 } })
  })

  it('reads bought things with and without a depth', () => {
    expect(piece(set, 'sleeve-of-shop')).toMatchObject({
      outside: { length: { nominal: 146, halfWidth: 0.8 }, width: { nominal: 111, halfWidth: 0.8 }, depth: null },
      thickness: { nominal: 0.6, halfWidth: 0.1 },
    })
    expect(piece(set, 'tin')).toMatchObject({ inside: null, outside: { depth: { nominal: 38, halfWidth: null } } })
  })

  it('reads a custom outline and its scores', () => {
    expect(piece(set, 'tag')).toMatchObject({
      scores: [
        { fold: 'mountain', angle: 180 },
        { fold: 'valley', angle: 90 },
      ],
      inside: { depth: 12.7 },
      outside: { height: null },
    })
  })

  it('reads stacks, orientation and papers of fits', () => {
    const [cardIn, stack, pack, closes, wraps] = set.fits
    expect(cardIn).toMatchObject({
      isStack: false,
      turn: 'quarter',
      workmanship: 'careful',
      clearance: { name: 'loose', length: { min: 3.175, max: 12.7 } },
    })
    expect(stack).toMatchObject({
      isStack: true,
      stands: 'upright',
      put: [
        { count: 4, piece: 'card' },
        { count: 4, piece: 'pointed' },
        { count: 1, piece: 'leaf' },
        { count: 2, piece: 'flat' },
      ],
    })
    expect(pack).toMatchObject({
      clearance: { name: null, length: { min: 0.5, max: 12 }, width: { min: 0.5, max: 12 } },
      turn: 'none',
    })
    expect(closes).toMatchObject({ papers: ['pearl', 'kraft'], clearance: { name: 'slip', strict: true } })
    expect(wraps).toMatchObject({ clearance: { overlap: { min: 10, max: null }, strict: false } })
  })

  it('keeps the author’s own steps', () => {
    expect(set.steps).toEqual(['Cut the base to {base.blank}.', 'Fold: every score.'])
  })
})

describe('a band that does not say what it goes round', () => {
  const text = `${onePiece('kind: box, stock: smooth, blank: 200 x 158, wall: 20')}  band: { kind: band, stock: smooth, width: 40 }\n`

  it('takes it from the fit that puts it there', () => {
    const set = soundSet(`${text}fits: { wraps: { put: band, around: piece } }\n`)
    expect(set.pieces.get('band')).toMatchObject({ around: 'piece' })
  })
})

describe('a set without a title or a sheet', () => {
  it('is called by its name and cut from the common sheet of its unit', () => {
    const text = onePiece('kind: insert, stock: smooth, size: 3 x 2')
    expect(soundSet(text)).toMatchObject({ title: 'trial', sheet: { name: 'a4', length: 297, width: 210 } })
    expect(soundSet(`${text}units: in\n`).sheet).toMatchObject({ name: 'letter' })
  })
})

describe('names of rules', () => {
  const text = `${onePiece('kind: insert, stock: smooth, size: 30 x 20')}checks: { fit/clearence: warn }\n`

  it('are looked at for their form where the rules are not known', () => {
    expect(readSet(text, 'trial.yaml', emptyWorkspace()).problems).toEqual([])
  })

  it('are held against the rules where they are', () => {
    const { problems } = readSet(text, 'trial.yaml', emptyWorkspace(), ['fit/clearance', 'fit/headspace'])
    expect(problems).toMatchObject([
      { code: 'unknown-rule', hint: 'Did you mean “fit/clearance”?', at: { line: 6, column: 11 } },
    ])
  })
})
