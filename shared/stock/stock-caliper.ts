import type { Stock } from '../template/template-model.ts'
import { dimension, source } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'
import { defaultCaliperShare, estimateCaliper, estimatedCaliperShare } from './caliper-estimate.ts'

/** Nominal caliper, its half-width, and whether it had to be estimated from the grammage. */
export function caliperOf(stock: Stock): {
  readonly nominal: number
  readonly halfWidth: number
  readonly isEstimated: boolean
} {
  if (stock.caliper !== null) {
    return {
      nominal: stock.caliper,
      halfWidth: stock.caliperHalfWidth ?? stock.caliper * defaultCaliperShare(stock.grammage),
      isEstimated: false,
    }
  }
  const nominal = estimateCaliper(stock.grammage ?? 0)
  return { nominal, halfWidth: nominal * estimatedCaliperShare, isEstimated: true }
}

/** Caliper of a stock as a dimension; all pieces of the stock share its source. */
export function stockCaliper(stock: Stock): Dimension {
  const { nominal, halfWidth } = caliperOf(stock)
  return dimension(nominal, [source(`caliper(${stock.name})`, 1, halfWidth)])
}
