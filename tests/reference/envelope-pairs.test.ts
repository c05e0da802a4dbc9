import { describe, expect, it } from 'vitest'
import { checkText, fitOf } from '../support/check-text.ts'
import { readCsv } from '../support/csv.ts'

/*
 * Published pairs of envelope and card. Sources of the copy beside this test: merchants' and trade tables for the
 * announcement series (two or more independent ones a size), readings of DIN 678 and secondary tables of ISO 216 and
 * ISO 269 for the others. Outside sizes of the envelopes; paper of 0.13 mm, cards of 0.30 mm folded once, as flat cards.
 */
const rows = readCsv(new URL('envelope-sizes.csv', import.meta.url)).filter(
  (row) => row['card_long_mm'] !== '' && row['confidence_card'] !== 'memory',
)

interface Pair {
  readonly name: string
  readonly series: string
  readonly envelope: readonly [number, number]
  readonly card: readonly [number, number]
}

const number = (text: string | undefined): number => Number(text)
const pairs: readonly Pair[] = rows.map((row) => ({
  name: `${row['name'] ?? ''} ${row['card_variant'] ?? ''}`,
  series: row['series'] ?? '',
  envelope: [number(row['env_long_mm']), number(row['env_short_mm'])],
  card: [number(row['card_long_mm']), number(row['card_short_mm'])],
}))

/** A card put in a bought envelope; `layers` sheets thick. */
const setText = ({ envelope, card }: Pair, fold: 'long-edge' | 'none'): string => `
foldgauge: 1
set: pair
title: A published pair
stocks: { cover: { grammage: 270 gsm, caliper: 0.30 mm } }
pieces:
  card: { kind: card, stock: cover, folded: ${card[0]} x ${card[1]} mm, fold: ${fold} }
  envelope: { kind: bought, outside: ${envelope[0]} x ${envelope[1]} mm ± 0.8 mm, thickness: 0.13 mm }
fits:
  card-in-envelope: { put: card, in: envelope, turn: none }
`

const isSheet = (pair: Pair): boolean => /sheet|folded in three|envelope$/.test(pair.name)
const judge = (pair: Pair) => fitOf(checkText(setText(pair, isSheet(pair) ? 'none' : 'long-edge')), 'card-in-envelope')

describe('published cards in their envelopes', () => {
  it('covers the announcement series in all its variants and the ISO sizes', () => {
    expect(pairs.filter((pair) => pair.series === 'announcement').length).toBeGreaterThanOrEqual(10)
    expect(pairs.filter((pair) => pair.series === 'C series').length).toBeGreaterThanOrEqual(4)
  })

  it.each(pairs.map((pair) => [pair.name, pair] as const))('%s does not bind', (_name, pair) => {
    const fit = judge(pair)
    for (const axis of fit.axes)
      expect(axis.binds, `${axis.axis}: ${String(axis.clearance.nominal)} mm`).toBeLessThanOrEqual(0.05)
  })

  it('rattles only where A4 folded in three lies in C6/C5, which is made for machine inserting; in DL it does not', () => {
    const rattling = pairs
      .filter((pair) => judge(pair).axes.some((axis) => axis.rattles > 0.05))
      .map((pair) => pair.name)
    expect(rattling).toEqual(['C6/C5 A4 folded in three'])
  })

  const announcement = pairs.filter(
    (pair) => /^A\d+$/.test(pair.name.split(' ')[0] ?? '') && pair.series === 'announcement',
  )
  const byEnvelope = [...new Map(announcement.map((pair) => [pair.envelope.join(), pair])).values()]
  it.each(byEnvelope.slice(0, -1).map((pair, index) => [pair.name, pair, byEnvelope[index + 1]] as const))(
    'the card of the next larger envelope fails in %s',
    (_name, pair, next) => {
      const wrong: Pair = { ...pair, card: next?.card ?? pair.card }
      expect(fitOf(checkText(setText(wrong, 'long-edge')), 'card-in-envelope').verdict).toBe('fail')
    },
  )

  const cSeries = pairs.filter((pair) => pair.series === 'C series').toSorted((a, b) => a.envelope[0] - b.envelope[0])
  it.each(cSeries.slice(0, -1).map((pair, index) => [pair.name, pair, cSeries[index + 1]] as const))(
    'the sheet of the next larger C size fails in %s',
    (_name, pair, next) => {
      const wrong: Pair = { ...pair, card: next?.card ?? pair.card }
      expect(fitOf(checkText(setText(wrong, 'none')), 'card-in-envelope').verdict).toBe('fail')
    },
  )
})

describe('published slips are caught', () => {
  it('a card 4 7/8 x 6 1/2 in for an A6 envelope of 4 3/4 x 6 1/2 in', () => {
    const slip: Pair = { name: 'slip', series: '', envelope: [165.1, 120.65], card: [165.1, 123.825] }
    expect(fitOf(checkText(setText(slip, 'long-edge')), 'card-in-envelope').verdict).toBe('fail')
  })

  it('an A8 blank of 10 1/2 x 7 7/8 in with its fold at 5 in, which is not the middle', () => {
    const report = checkText(`
foldgauge: 1
set: slip
title: A fold mark that is not the middle
units: in
stocks: { cover: { weight: 100 lb cover, caliper: 12 pt } }
pieces:
  card: { kind: card, stock: cover, blank: 10 1/2 x 7 7/8, folded: 7 7/8 x 5, fold: long-edge }
  envelope: { kind: bought, outside: 8 1/8 x 5 1/2 in ± 1/32 in, thickness: 5 mil }
fits:
  card-in-envelope: { put: card, in: envelope }
`)
    expect(report.verdicts.find((verdict) => verdict.rule === 'blank/panels-unequal')?.status).toBe('warn')
    expect(fitOf(report, 'card-in-envelope').verdict).toBe('fail')
  })
})
