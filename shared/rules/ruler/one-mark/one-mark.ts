import { judgeAxis, type JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, listInWords, fitInWords } from '../../wording.ts'
import { markedFits, mayFailAt, type MarkedAxis, type MarkOfAxis } from '../marks.ts'

/** A measure and the mark it is mistaken for. */
interface Misreading extends MarkOfAxis {
  readonly read: number
}

const failsAt = (judged: JudgedSet, axis: JudgedAxis, shift: number): boolean =>
  mayFailAt(axis, shift) && judgeAxis(axis.clearance, axis.give, judged.set.tokens, 1, shift).verdict === 'fail'

/** Measures of an axis whose misreading by one mark makes it fail, on either side. */
function misreadingsOf(judged: JudgedSet, { axis, marks: all }: MarkedAxis): readonly Misreading[] {
  const { ruler } = judged.set.tokens
  const marks = all.map((mark) => ({
    ...mark,
    step: Math.abs(mark.coefficient) * ruler[mark.measure.grid],
  }))
  const sides = axis.clearance.requirement.isStrict ? ([-1, 1] as const) : ([-1] as const)
  const found: Misreading[] = []
  for (const side of sides) {
    // A larger step moves the clearance further: once one does no harm, no smaller one does. Most steps are alike.
    let harmful = Infinity
    for (const mark of marks.toSorted((a, b) => b.step - a.step)) {
      if (harmful - mark.step > 1e-9 && !failsAt(judged, axis, side * mark.step)) break
      harmful = mark.step
      const by = side * Math.sign(mark.coefficient) * ruler[mark.measure.grid]
      found.push({ ...mark, read: mark.measure.nominal + by })
    }
  }
  return found
}

function judgeFitMarks(judged: JudgedSet, fit: JudgedFit, axes: readonly MarkedAxis[]): Finding {
  const common = { subject: fit.fit.id, path: ['fits', fit.fit.id] }
  const thing = fitInWords(fit)
  if (fit.verdict === 'fail')
    return {
      ...common,
      severity: 'unchecked',
      measure: null,
      message: `${thing} fails as drawn; which marks matter is asked once it does not.`,
    }
  const byMeasure = new Map<string, Misreading>()
  for (const axis of axes)
    for (const misreading of misreadingsOf(judged, axis))
      if (!byMeasure.has(misreading.measure.id)) byMeasure.set(misreading.measure.id, misreading)
  const words = [...byMeasure.values()].map(
    ({ measure, read }) =>
      `${measure.what} of ${measure.piece} (${inSetUnits(judged, read)} for ${inSetUnits(judged, measure.nominal)})`,
  )
  return {
    ...common,
    severity: words.length === 0 ? 'pass' : 'info',
    measure: { actual: words.length, limit: 0, sense: 'at-most', unit: 'count' },
    message:
      words.length === 0
        ? `${thing} survives any one measure misread by one mark.`
        : `${thing} fails if one measure is misread by one mark: ${listInWords(words)}. Say so in the steps, or leave more clearance.`,
  }
}

export const oneMarkRule: Rule = {
  id: 'ruler/one-mark',
  level: 'info',
  title: 'A fit survives one misread mark',
  why: 'People count lines on a ruler and miscount. Where one wrong line spoils a box, the steps should warn of just that line.',
  origin: {
    kind: 'derived',
    source: 'The clearance moved by what one mark of the ruler does to it, each measure by itself, and judged again.',
  },
  remedy: 'Point out the measure in the steps, or leave more clearance there.',
  judge: (judged) => [...markedFits(judged)].map(([fit, axes]) => judgeFitMarks(judged, fit, axes)),
}
