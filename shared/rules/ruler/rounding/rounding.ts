import { judgeAxis, type JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { languageDefaults } from '../../../pieces/language-defaults.ts'
import { formatLength } from '../../../units/format-length.ts'
import { roundToGrid } from '../../../units/grid.ts'
import type { Ruler, RulerUnit } from '../../../units/units.ts'
import type { Finding, Rule } from '../../rule.ts'
import { acrossInWords, inSetUnits, listInWords, fitInWords } from '../../wording.ts'
import { markedFits, mayFailAt, type MarkedAxis, type MarkOfAxis } from '../marks.ts'

const usualRulers: Readonly<Record<RulerUnit, Ruler>> = {
  mm: { cut: languageDefaults.rulerMetric.value, score: languageDefaults.rulerMetric.value },
  in: { cut: languageDefaults.rulerInchCut.value, score: languageDefaults.rulerInchScore.value },
}

/** The ruler makers who work in a unit have: the set's own in its own unit, else the usual one. */
const rulerFor = (judged: JudgedSet, unit: RulerUnit): Ruler =>
  judged.set.tokens.units === unit ? judged.set.tokens.ruler : usualRulers[unit]

interface Moved {
  readonly unit: RulerUnit
  readonly axis: JudgedAxis
  readonly shift: number
  readonly marks: readonly MarkOfAxis[]
}

const roundingOf = ({ measure, coefficient }: MarkOfAxis, ruler: Ruler): number =>
  coefficient * (roundToGrid(measure.nominal, ruler[measure.grid]) - measure.nominal)

/** Axes of a fit that fail once every measure is rounded to the marks of a unit. */
function failuresIn(judged: JudgedSet, axes: readonly MarkedAxis[], unit: RulerUnit): readonly Moved[] {
  const ruler = rulerFor(judged, unit)
  return axes.flatMap(({ axis, marks }) => {
    const shift = marks.reduce((sum, mark) => sum + roundingOf(mark, ruler), 0)
    if (Math.abs(shift) < 1e-9 || !mayFailAt(axis, shift)) return []
    const moved = judgeAxis(axis.clearance, axis.give, judged.set.tokens, 1, shift)
    return moved.verdict === 'fail' ? [{ unit, axis, shift, marks }] : []
  })
}

/** `in inches (cuts to 1/16 in, scores to 1/8 in) across the width, 0.93 mm becoming -0.7 mm: wall of lid 14 mm to 1/2 in` */
function failureInWords(judged: JudgedSet, { unit, axis, shift, marks }: Moved): string {
  const ruler = rulerFor(judged, unit)
  const { nominal } = axis.clearance.clearance
  const grids = `cuts to ${formatLength(ruler.cut, unit)}, scores to ${formatLength(ruler.score, unit)}`
  const worst = marks
    .toSorted((a, b) => Math.abs(roundingOf(b, ruler)) - Math.abs(roundingOf(a, ruler)))
    .filter((mark) => Math.abs(roundingOf(mark, ruler)) > 1e-9)
    .map(({ measure }) => {
      const to = formatLength(roundToGrid(measure.nominal, ruler[measure.grid]), unit)
      return `${measure.what} of ${measure.piece} ${inSetUnits(judged, measure.nominal)} to ${to}`
    })
  return `in ${unit === 'in' ? 'inches' : 'millimetres'} (${grids}) ${acrossInWords(axis.clearance.axis)}, where ${inSetUnits(judged, nominal)} becomes ${inSetUnits(judged, nominal + shift)}: ${listInWords(worst, 2)}`
}

function judgeRounding(judged: JudgedSet, fit: JudgedFit, axes: readonly MarkedAxis[]): Finding {
  const common = { subject: fit.fit.id, path: ['fits', fit.fit.id] }
  const thing = fitInWords(fit)
  if (fit.verdict === 'fail')
    return {
      ...common,
      severity: 'unchecked',
      measure: null,
      message: `${thing} fails as drawn; rounding is asked about once it does not.`,
    }
  const failures = (['mm', 'in'] as const).flatMap((unit) => failuresIn(judged, axes, unit))
  const units = new Set(failures.map((failure) => failure.unit))
  const firstOfEach = [...units].flatMap((unit) => failures.find((failure) => failure.unit === unit) ?? [])
  return {
    ...common,
    severity: failures.length === 0 ? 'pass' : 'warn',
    measure: { actual: units.size, limit: 0, sense: 'at-most', unit: 'count' },
    message:
      failures.length === 0
        ? `${thing} holds when measures are rounded to marks, in millimetres and in inches.`
        : `${thing} fails once measures are rounded to marks ${listInWords(firstOfEach.map((failure) => failureInWords(judged, failure)))}. Give makers one unit only, or design sizes of their own for the other.`,
  }
}

export const roundingRule: Rule = {
  id: 'ruler/rounding',
  level: 'warn',
  title: 'The fit holds on the marks makers are given',
  why: 'Metric is a second design, not a conversion: measures rounded to sixteenths and eighths move each score by up to a millimetre and a half.',
  origin: {
    kind: 'derived',
    source:
      'Every measure rounded to the nearest mark of each unit and the clearance judged again. Marks of 1 mm, 1/16 and 1/8 in are common practice.',
  },
  remedy: 'Give makers the measures of one unit only, or design sizes of their own for the other.',
  judge: (judged) => [...markedFits(judged)].map(([fit, axes]) => judgeRounding(judged, fit, axes)),
}
