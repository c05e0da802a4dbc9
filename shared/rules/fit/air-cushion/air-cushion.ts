import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { modelDefaults } from '../../../pieces/model-defaults.ts'
import { paperWeight } from '../../paper-weight.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'

const gravity = 9.81
const metre = 1000

/**
 * Seconds a lid takes to sink onto its base, held up by the air that leaks round it: t = d²/2K, K = Σ(side·gap³)·mg/(12µA²).
 * An upper bound, for slits at the corners leak too.
 * @param sides outside of the base and the gap beside each of its four sides, in millimetres
 * @see physics C.7 (derived: plane Poiseuille flow)
 */
export function sinkingTime(
  sides: { readonly length: number; readonly width: number; readonly lengthGap: number; readonly widthGap: number },
  overlap: number,
  grams: number,
): number {
  const length = sides.length / metre
  const width = sides.width / metre
  // The long sides leak through the gap across the width, the short ones through the gap along the length.
  const leak = 2 * (length * (sides.widthGap / metre) ** 3 + width * (sides.lengthGap / metre) ** 3)
  const factor = (leak * (grams / 1000) * gravity) / (12 * modelDefaults.airViscosity.value * (length * width) ** 2)
  return (overlap / metre) ** 2 / (2 * factor)
}

const gapOf = (fit: JudgedFit, axis: 'length' | 'width'): number =>
  (fit.axes.find((each) => each.clearance.axis === axis)?.clearance.clearance.nominal ?? 0) / 2

function judgeCushion(judged: JudgedSet, fit: JudgedFit): readonly Finding[] {
  const { seat } = fit
  if (seat === null || fit.clearances.fitCase !== 'lid') return []
  const base = judged.model.folded(seat.base)
  const lid = judged.model.folded(seat.lid)
  const common = { subject: fit.fit.id, path: ['fits', fit.fit.id] }
  const gaps = { lengthGap: gapOf(fit, 'length'), widthGap: gapOf(fit, 'width') }
  const grams = paperWeight(judged, seat.lid)
  if (grams === null)
    return [
      {
        ...common,
        severity: 'unchecked',
        measure: null,
        message: `How fast ${seat.lid} sinks is not known without the grammage of its stock.`,
      },
    ]
  if (gaps.lengthGap <= 0 || gaps.widthGap <= 0)
    return [
      {
        ...common,
        severity: 'unchecked',
        measure: null,
        message: `${seat.lid} has no gap round ${seat.base} through which air could leave.`,
      },
    ]
  const overlap = Math.min(lid.cavity?.depth?.nominal ?? 0, base.outside.height.nominal)
  const plane = { length: base.outside.length.nominal, width: base.outside.width.nominal }
  const seconds = sinkingTime({ ...plane, ...gaps }, overlap, grams)
  const limit = ruleLimits.airCushionSlow.value
  const isSlow = seconds > limit
  const sinks = seconds >= 10 ? `${seconds.toFixed(0)} s` : `${seconds.toFixed(1)} s`
  return [
    {
      ...common,
      severity: isSlow ? 'info' : 'pass',
      measure: { actual: seconds, limit, sense: 'at-most', unit: 's' },
      message: isSlow
        ? `${seat.lid} sinks onto ${seat.base} on a cushion of air, at most ${sinks} long: makers may take it for tight. A wider gap or a thumb notch lets the air out.`
        : `${seat.lid} sinks onto ${seat.base} in at most ${sinks}.`,
    },
  ]
}

export const airCushionRule: Rule = {
  id: 'fit/air-cushion',
  level: 'info',
  title: 'Air gets out from under the lid',
  why: 'A deep lid with a narrow gap floats down slowly. Makers take that for binding and force it.',
  origin: {
    kind: 'derived',
    source:
      'Plane Poiseuille leak through the gap, an upper bound since corners leak; from when on it is felt is a guess.',
  },
  remedy: 'Nothing need be done; a wider gap, a shallower lid or a thumb notch lets the air out faster.',
  judge: (judged) => judged.fits.flatMap((fit) => judgeCushion(judged, fit)),
}
