import { apparentDensity } from '../../../stock/caliper-estimate.ts'
import { formatLength } from '../../../units/format-length.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'
import { usedStocks, type UsedStock } from '../used-stocks.ts'

function judgeStock({ stock, path }: UsedStock): readonly Finding[] {
  // A caliper reckoned from the weight agrees with it by construction; that it is missing is said elsewhere.
  if (stock.caliper === null) return []
  const common = { subject: stock.name, path }
  if (stock.grammage === null)
    return [
      {
        ...common,
        severity: 'unchecked',
        measure: null,
        message: `${stock.name} has no weight to hold its caliper against.`,
      },
    ]
  const density = apparentDensity(stock.grammage, stock.caliper)
  const low = ruleLimits.densityLow.value
  const high = ruleLimits.densityHigh.value
  const isHeavy = density > high
  const isPlausible = density >= low && !isHeavy
  const facts = `${String(Math.round(stock.grammage))} g/m² at ${formatLength(stock.caliper, 'mm', { decimals: 3 })} make ${density.toFixed(2)} g/cm³`
  return [
    {
      ...common,
      severity: isPlausible ? 'pass' : 'warn',
      measure: isHeavy
        ? { actual: density, limit: high, sense: 'at-most', unit: 'g/cm3' }
        : { actual: density, limit: low, sense: 'at-least', unit: 'g/cm3' },
      message: isPlausible
        ? `${stock.name}: ${facts}.`
        : `${stock.name}: ${facts}, and paper lies between ${String(low)} and ${String(high)}. Look at both again: is that the thickness of one sheet, in the unit you meant, and the weight of the same paper?`,
      path,
    },
  ]
}

export const caliperImplausibleRule: Rule = {
  id: 'stock/caliper-implausible',
  level: 'warn',
  title: 'Weight and thickness belong to the same paper',
  why: 'A slip between points, thousandths and millimetres, or between one sheet and ten, moves every fit and shows nowhere else.',
  origin: {
    kind: 'from memory',
    source: 'Apparent density as ISO 534 defines it; the bounds 0.5 and 1.3 g/cm³ are from memory.',
  },
  remedy: 'Measure ten sheets together and divide by ten; check the unit of both figures.',
  judge: (judged) => usedStocks(judged).flatMap(judgeStock),
}
