import type { Verdict } from '../../../shared/report/report.ts'
import { lengthIn } from '../../lib/units.ts'
import { versionWords } from '../../words/version-words.ts'

type Measure = NonNullable<Verdict['measure']>

const suffixes = {
  mm2: ' mm²',
  count: '',
  g: ' g',
  gsm: ' g/m²',
  'g/cm3': ' g/cm³',
  ratio: '',
  days: ' d',
  s: ' s',
} as const

const valueText = (value: number, unit: Measure['unit'], units: 'mm' | 'in'): string => {
  if (unit === 'share') return versionWords.share(value)
  if (unit === 'mm') return lengthIn(value, units)
  return `${String(Number(value.toFixed(2)))}${suffixes[unit]}`
}

/** What was measured, and the limit it was held to. */
export function measureText(
  measure: Verdict['measure'],
  units: 'mm' | 'in',
): { readonly actual: string; readonly limit: string } {
  if (measure === null) return { actual: '–', limit: '–' }
  const sense = { 'at-least': versionWords.atLeast, 'at-most': versionWords.atMost, equal: versionWords.equal }[
    measure.sense
  ]
  return {
    actual: valueText(measure.actual, measure.unit, units),
    limit: `${sense} ${valueText(measure.limit, measure.unit, units)}`,
  }
}
