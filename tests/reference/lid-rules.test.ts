import { describe, expect, it } from 'vitest'
import { checkText, fitOf } from '../support/check-text.ts'

/*
 * Trade rules for a lid that goes over a tray of card, read as "so much larger between score lines, same scores, tabs
 * alike". Sources: a sixteenth of an inch (a craft tutorial, first-hand), a quarter of a centimetre (two craft tutorials),
 * an eighth of an inch (common practice, no source). Derived figures: C = Δs − 2t plain, Δs − 4t where both have tabs.
 */
interface Rule {
  readonly name: string
  readonly larger: number
}

const rules: readonly Rule[] = [
  { name: 'a sixteenth of an inch', larger: 1.5875 },
  { name: 'a quarter of a centimetre', larger: 2.5 },
  { name: 'an eighth of an inch', larger: 3.175 },
]
const calipers = [0.25, 0.3, 0.38] as const

const judge = (larger: number, caliper: number) =>
  fitOf(
    checkText(`
foldgauge: 1
set: lid
title: A lid by a trade rule
stocks: { card: { grammage: ${String(Math.round(caliper * 850))} gsm, caliper: ${String(caliper)} mm } }
pieces:
  base: { kind: box, stock: card, blank: 247.65 x 215.9 mm, wall: 50.8 mm }
  lid: { kind: lid, stock: card, blank: ${String(247.65 + larger)} x ${String(215.9 + larger)} mm, wall: 50.8 mm, thumb-notch: true }
fits:
  lid-on-base: { put: lid, over: base }
`),
    'lid-on-base',
  )

describe('trade rules for lids, judged for home makers', () => {
  const table = rules.flatMap((rule) =>
    calipers.map((caliper) => {
      const fit = judge(rule.larger, caliper)
      const [plain, tabbed] = fit.axes
      return { rule, caliper, fit, plain, tabbed }
    }),
  )

  it.each(table.map((row) => [row.rule.name, row.caliper, row] as const))(
    '%s in card of %d mm has the derived clearance',
    (_name, _caliper, row) => {
      expect(row.plain?.clearance.nominal).toBeCloseTo(row.rule.larger - 2 * row.caliper, 6)
      expect(row.tabbed?.clearance.nominal).toBeCloseTo(row.rule.larger - 4 * row.caliper, 6)
    },
  )

  it('comes out as a reader can follow', () => {
    const shown = table.map(({ rule, caliper, fit, plain, tabbed }) =>
      [
        rule.name.padEnd(25),
        `${caliper.toFixed(2)} mm`,
        `plain ${(plain?.clearance.nominal ?? 0).toFixed(2)} (${((plain?.binds ?? 0) * 100).toFixed(0)} % bind)`,
        `tabbed ${(tabbed?.clearance.nominal ?? 0).toFixed(2)} (${((tabbed?.binds ?? 0) * 100).toFixed(0)} % bind)`,
        fit.verdict,
        `${(fit.closes * 100).toFixed(0)} % close`,
      ].join('  '),
    )
    expect(shown).toMatchInlineSnapshot(`
      [
        "a sixteenth of an inch     0.25 mm  plain 1.09 (0 % bind)  tabbed 0.59 (10 % bind)  warn  100 % close",
        "a sixteenth of an inch     0.30 mm  plain 0.99 (1 % bind)  tabbed 0.39 (21 % bind)  warn  98 % close",
        "a sixteenth of an inch     0.38 mm  plain 0.83 (2 % bind)  tabbed 0.07 (45 % bind)  warn  90 % close",
        "a quarter of a centimetre  0.25 mm  plain 2.00 (0 % bind)  tabbed 1.50 (0 % bind)  pass  100 % close",
        "a quarter of a centimetre  0.30 mm  plain 1.90 (0 % bind)  tabbed 1.30 (0 % bind)  pass  100 % close",
        "a quarter of a centimetre  0.38 mm  plain 1.74 (0 % bind)  tabbed 0.98 (3 % bind)  pass  100 % close",
        "an eighth of an inch       0.25 mm  plain 2.68 (0 % bind)  tabbed 2.18 (0 % bind)  pass  100 % close",
        "an eighth of an inch       0.30 mm  plain 2.58 (0 % bind)  tabbed 1.98 (0 % bind)  pass  100 % close",
        "an eighth of an inch       0.38 mm  plain 2.42 (0 % bind)  tabbed 1.66 (0 % bind)  pass  100 % close",
      ]
    `)
  })

  it('gets tighter with thicker card and looser with a larger lid', () => {
    for (const rule of rules) {
      const binds = calipers.map((caliper) => judge(rule.larger, caliper).axes[1]?.binds ?? 0)
      expect(binds).toEqual([...binds].sort((a, b) => a - b))
    }
    for (const caliper of calipers) {
      const binds = rules.map((rule) => judge(rule.larger, caliper).axes[1]?.binds ?? 0)
      expect(binds).toEqual([...binds].sort((a, b) => b - a))
    }
  })
})
