import { assumedDensity, estimatedCaliperShare } from '../../../stock/caliper-estimate.ts'
import { caliperOf } from '../../../stock/stock-caliper.ts'
import { formatLength } from '../../../units/format-length.ts'
import type { Finding, Rule } from '../../rule.ts'
import { usedStocks, type UsedStock } from '../used-stocks.ts'

function judgeStock({ stock, path }: UsedStock): Finding {
  const { nominal, halfWidth, isEstimated } = caliperOf(stock)
  const thick = formatLength(nominal, 'mm', { decimals: 3 })
  const spread = formatLength(halfWidth, 'mm', { decimals: 3 })
  return {
    subject: stock.name,
    severity: isEstimated ? 'warn' : 'pass',
    measure: null,
    message: isEstimated
      ? `${stock.name} has no caliper, so ${thick} is reckoned from ${String(Math.round(stock.grammage ?? 0))} g/m² at ${String(assumedDensity)} g/cm³, give or take ${String(estimatedCaliperShare * 100)} %. Measure ten sheets together and write caliper: ${formatLength(nominal * 10, 'mm', { decimals: 1, bare: true })} mm / 10 with your figure.`
      : `${stock.name} is ${thick} thick, give or take ${spread}.`,
    path,
  }
}

export const caliperMissingRule: Rule = {
  id: 'stock/caliper-missing',
  level: 'warn',
  title: 'The thickness of the paper is known',
  why: 'Weight does not determine thickness: papers of one weight differ by a fifth and more, and a lid loses two to six thicknesses.',
  origin: {
    kind: 'published',
    source: 'Makers publish 0.38 to 0.46 mm for board of 350 g/m². The density used for an estimate is from memory.',
  },
  remedy: 'Measure ten sheets together and write the sum as `caliper: 3.2 mm / 10`.',
  judge: (judged) => usedStocks(judged).map(judgeStock),
}
