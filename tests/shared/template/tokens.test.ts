import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readShare } from '../../../shared/template/read-share.ts'
import { isCalendarDate } from '../../../shared/template/read-waivers.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import { exampleWorkspace, onePiece, soundSet } from './support.ts'

const insert = onePiece('kind: insert, stock: smooth, size: 30 x 20')
const workspace = (lines: string) => {
  const read = readWorkspace(`foldgauge: 1\n${lines}\n`, 'foldgauge.yaml')
  expect(read.problems).toEqual([])
  return read
}

describe('a workspace that does not say', () => {
  it('has the makers home, studio and die', () => {
    const { makers, workmanship } = emptyWorkspace().tokens
    expect(workmanship).toBe('home')
    expect([...makers.values()]).toEqual([
      { name: 'home', cut: 0.35, score: 0.25, fence: 0.25 },
      { name: 'studio', cut: 0.2, score: 0.15, fence: 0.15 },
      { name: 'die', cut: 0.25, score: 0.2, fence: 0.05 },
    ])
  })

  it('wants 95 % of builds to go together and fails below 85 %', () => {
    expect(emptyWorkspace().tokens).toMatchObject({ target: 0.95, floor: 0.85, humidity: null })
  })

  it('has a ruler of one millimetre, in inches of a sixteenth for cutting and an eighth for scoring', () => {
    expect(workspace('').tokens.ruler).toEqual({ cut: 1, score: 1 })
    expect(workspace('units: in').tokens.ruler).toEqual({ cut: 1.5875, score: 3.175 })
    expect(workspace('units: in\nruler: 1/32').tokens.ruler).toEqual({ cut: 0.79375, score: 0.79375 })
    expect(workspace('ruler: { cut: 0.5, score: 1 }').tokens.ruler).toEqual({ cut: 0.5, score: 1 })
  })

  it('looks for its sets in their usual folder', () => {
    expect(workspace('').sets).toEqual(['sets/*.yaml'])
  })
})

describe('a maker of the author’s own', () => {
  it('takes the fence of home where it has none', () => {
    expect(exampleWorkspace().tokens.makers.get('workshop')).toEqual({
      name: 'workshop',
      cut: 0.3,
      score: 0.2,
      fence: 0.25,
    })
  })
})

describe('a set’s own tokens', () => {
  const below = workspace(
    'stocks: { smooth: { caliper: 0.5 mm }, thin: { caliper: 0.1 mm } }\nsizes: { note: 148 x 105 }\nworkmanship: studio\nchecks: { fit/opening: off }\ntarget: 90 %\nruler: 0.5',
  )
  const set = soundSet(`${insert}checks: { fit/headspace: warn }\n`, below)

  it('win over the workspace’s entry by entry', () => {
    expect(set.tokens.stocks.get('smooth')?.caliper).toBe(0.3)
    expect(set.tokens.stocks.get('thin')?.caliper).toBe(0.1)
    expect(set.tokens.checks).toEqual(
      new Map([
        ['fit/opening', 'off'],
        ['fit/headspace', 'warn'],
      ]),
    )
  })

  it('leave the rest as it is', () => {
    expect(set.tokens).toMatchObject({
      workmanship: 'studio',
      target: 0.9,
      floor: 0.85,
      ruler: { cut: 0.5, score: 0.5 },
    })
  })

  it('do not reach back into the workspace', () => {
    expect(below.tokens.stocks.get('smooth')?.caliper).toBe(0.5)
    expect(below.tokens.checks.has('fit/headspace')).toBe(false)
  })

  it('in the other unit come with the ruler of that unit', () => {
    expect(soundSet(`${insert}units: in\n`, below).tokens.ruler).toEqual({ cut: 1.5875, score: 3.175 })
  })

  it('need no format number below a workspace', () => {
    expect(soundSet(insert.replace('foldgauge: 1\n', ''), below).name).toBe('trial')
  })
})

describe('a size by name', () => {
  const card = (size: string) => onePiece(`kind: card, stock: smooth, folded: ${size}`)

  it('is the author’s own first', () => {
    const set = soundSet(`${card('iso-a6')}sizes: { iso-a6: 100 x 50 }\n`)
    expect(set.pieces.get('piece')).toMatchObject({ folded: { length: 100, width: 50 } })
  })

  it('may begin with a digit, as photographs’ sizes do', () => {
    const set = soundSet(`${card('5x7')}sizes: { 5x7: 7 x 5 in }\n`)
    expect(set.pieces.get('piece')).toMatchObject({ folded: { length: 177.8, width: 127 } })
  })

  it('is one built in else, which is then listed among the sizes', () => {
    const set = soundSet(card('iso-a6'))
    expect(set.pieces.get('piece')).toMatchObject({ folded: { length: 148, width: 105 } })
    expect([...set.tokens.sizes.keys()]).toEqual(['iso-a6'])
  })

  it('may stand for a size of a workspace that is built in', () => {
    expect(workspace('sizes: { note: iso-a6 }').tokens.sizes.get('note')).toEqual({ length: 148, width: 105 })
  })
})

describe('a family', () => {
  it('keeps to sizes of its workspace or to those built in', () => {
    const { families } = workspace(
      'sizes: { note: 148 x 105 }\nfamilies: { orchard: { title: Orchard, mark: pear, sizes: [note, iso-c6] } }',
    )
    expect(families.get('orchard')).toEqual({
      name: 'orchard',
      title: 'Orchard',
      mark: 'pear',
      sizes: ['note', 'iso-c6'],
    })
  })
})

describe('a share of builds', () => {
  it('is read from percent and from a decimal alike', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 999 }), (thousandths) => {
        const percent = readShare(`${String(thousandths / 10)} %`)
        const decimal = readShare(`0.${String(thousandths).padStart(3, '0')}`)
        expect(percent.ok && percent.value).toBeCloseTo(thousandths / 1000, 12)
        expect(decimal.ok && decimal.value).toBeCloseTo(thousandths / 1000, 12)
      }),
    )
  })
})

describe('the last day of a waiver', () => {
  it('is a day of the calendar, whichever it is', () => {
    fc.assert(
      fc.property(fc.date({ min: new Date('0001-01-01'), max: new Date('9999-12-31'), noInvalidDate: true }), (day) => {
        expect(isCalendarDate(day.toISOString().slice(0, 10))).toBe(true)
      }),
    )
  })

  it.each([
    '2027-02-29',
    '2100-02-29',
    '2027-04-31',
    '2027-13-01',
    '2027-00-10',
    '2027-01-00',
    '2027-1-1',
    '27-01-01',
    '2027/01/01',
    '',
  ])('is not %j', (text) => {
    expect(isCalendarDate(text)).toBe(false)
  })

  it('may be the leap day of a leap year', () => {
    expect(isCalendarDate('2028-02-29')).toBe(true)
    expect(isCalendarDate('2000-02-29')).toBe(true)
  })
})
