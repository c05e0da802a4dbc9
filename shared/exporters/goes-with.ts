import type { PagePlan } from '../drawing/page-frame.ts'
import type { Fit } from '../template/template-model.ts'

const listed = (numbers: readonly number[]): string =>
  numbers.length === 1
    ? `page ${String(numbers[0])}`
    : `pages ${numbers.slice(0, -1).join(', ')} and ${String(numbers[numbers.length - 1])}`

/**
 * Each piece's pages told which pages the pieces it fits are on.
 * @param before pages that come before these in the document
 */
export function goesWith(plans: readonly PagePlan[], fits: readonly Fit[], before: number): readonly PagePlan[] {
  const firstPage = new Map<string, number>()
  plans.forEach((plan, index) => {
    if (plan.piece !== undefined && !firstPage.has(plan.piece)) firstPage.set(plan.piece, before + index + 1)
  })
  const partners = (piece: string): readonly string[] =>
    fits.flatMap((fit) => {
      const inner = [...fit.put.map((entry) => entry.piece), ...(fit.holding === null ? [] : [fit.holding])]
      if (fit.to === piece) return fit.put.map((entry) => entry.piece)
      return inner.includes(piece) ? [fit.to] : []
    })
  return plans.map((plan) => {
    if (plan.piece === undefined) return plan
    const numbers = [...new Set(partners(plan.piece).flatMap((name) => firstPage.get(name) ?? []))].sort(
      (a, b) => a - b,
    )
    return numbers.length === 0 ? plan : { ...plan, aside: `${plan.aside} · goes with ${listed(numbers)}` }
  })
}
