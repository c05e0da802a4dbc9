import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../shared/check-template.ts'
import type { Report } from '../../../shared/report/report.ts'
import { emptyWorkspace } from '../../../shared/template/read-workspace.ts'

const pieces = {
  card: '{ kind: card, stock: cover, folded: 148 x 105 }',
  envelope: '{ kind: envelope, style: baronial, stock: text, pocket: 160 x 115, seam: 12 }',
  square: '{ kind: envelope, style: square-flap, stock: text, pocket: 160 x 115 }',
  base: '{ kind: box, stock: cover, blank: 210 x 165, wall: 22 }',
  lid: '{ kind: lid, stock: cover, blank: 198 x 153, wall: 15 }',
  sleeve: '{ kind: sleeve, stock: cover, around: base, width: 60, overlap: 15 }',
  band: '{ kind: band, stock: text, around: base, width: 40, overlap: 15 }',
  ribbon: '{ kind: band, ribbon: true, around: base, width: 10 }',
  bag: '{ kind: bag, stock: cover, inside: 180 x 60 x 220 }',
  insert: '{ kind: insert, stock: cover, size: 140 x 100 }',
  divider: '{ kind: divider, stock: cover, size: 160 x 20 }',
  photo: '{ kind: bought, outside: 150 x 100, thickness: 0.3 mm }',
  tin: '{ kind: bought, inside: 160 x 120 x 30, thickness: 0.3 mm }',
  odd: '{ kind: custom, stock: cover, outline: [[0, 0], [100, 0], [100, 50], [0, 50]], outside: 100 x 50 }',
} as const

function check(fits: string): Report {
  const text = `foldgauge: 1
set: trial
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
  text: { grammage: 120 gsm, caliper: 0.15 mm }
pieces:
${Object.entries(pieces)
  .map(([name, piece]) => `  ${name}: ${piece}`)
  .join('\n')}
fits:
  ${fits}
`
  return checkTemplate(text, emptyWorkspace(), { file: 'set.yaml', asOf: '2026-12-01' })
}

describe('fits that no pieces of their kinds could have', () => {
  const names = Object.keys(pieces)
  for (const relation of ['in', 'over', 'around']) {
    it(`always gives a report for any kind of piece put ${relation} any other`, () => {
      for (const put of names)
        for (const to of names.filter((name) => name !== put)) {
          const { errors, fits } = check(`trial: { put: ${put}, ${relation}: ${to} }`)
          expect(errors.length + fits.length, `${put} ${relation} ${to}`).toBe(1)
        }
    })
  }

  it('tells that a card without a pocket holds nothing, and what would', () => {
    const { errors, summary } = check('trial: { put: photo, in: card }')
    expect(summary.verdict).toBe('invalid')
    expect(errors).toMatchObject([
      {
        message: 'Fit trial needs the inside of card, which has none.',
        hint: 'Give card a “pocket”, or name the piece meant under “in”.',
        at: { path: ['pieces', 'card'] },
      },
    ])
  })

  it('tells that a box goes around nothing', () => {
    expect(check('trial: { put: base, around: envelope }').errors).toMatchObject([
      { message: expect.stringContaining('only a sleeve, a band or a ribbon goes around') as string },
    ])
  })
})

describe('a divider in a box', () => {
  it('is judged alike whether “stands: upright” is said or understood', () => {
    const axes = (more: string): unknown => check(`trial: { put: divider, in: base${more} }`).fits[0]?.axes
    expect(axes(', stands: upright')).toEqual(axes(''))
  })

  it('lies when it is said to lie', () => {
    const fit = check('trial: { put: divider, in: base, stands: flat }').fits[0]
    expect(fit?.axes.find(({ axis }) => axis === 'width')?.clearance.nominal).toBeCloseTo(120.36 - 20, 9)
  })
})
