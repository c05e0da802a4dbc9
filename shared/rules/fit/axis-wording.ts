import type { JudgedAxis } from '../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../assembly/judge-set.ts'
import type { AxisName, Verdict } from '../../report/report.ts'
import { distributionOf } from '../../uncertainty/distribution.ts'
import type { Finding } from '../rule.ts'
import { inSetUnits, madeBy, outOfHundred } from '../wording.ts'

/** How far short of the target an axis falls, and on which side. */
export type Miss = 'binds' | 'rattles' | null

/** Which side of its requirement an axis misses by more builds than the target allows; binding counts first. */
export function missOf(judged: JudgedSet, axis: JudgedAxis): Miss {
  const { target } = judged.set.tokens
  return 1 - axis.binds < target ? 'binds' : 1 - axis.rattles < target ? 'rattles' : null
}

/** `34 of 100 home-made ones would have less than 0.2 mm of room (5 allowed)` */
export function sharesInWords(
  judged: JudgedSet,
  fit: JudgedFit,
  axis: JudgedAxis,
  miss: 'binds' | 'rattles',
  noun: string,
): string {
  const { band } = axis.clearance.requirement
  const isBinding = miss === 'binds'
  const share = outOfHundred(isBinding ? axis.binds : axis.rattles)
  const limit = inSetUnits(judged, (isBinding ? band.min : band.max) ?? 0)
  const allowed = outOfHundred(1 - judged.set.tokens.target)
  return `${share} of 100 ${madeBy(judged, fit)} ones would have ${isBinding ? 'less' : 'more'} than ${limit} ${noun} (${allowed} allowed)`
}

/** `As drawn there is 0.4 mm; about 0.3 mm more would do.` */
export function needInWords(judged: JudgedSet, axis: JudgedAxis, miss: 'binds' | 'rattles'): string {
  const { clearance, requirement } = axis.clearance
  const { target } = judged.set.tokens
  const distribution = distributionOf(clearance)
  const by =
    miss === 'binds'
      ? (requirement.band.min ?? 0) - distribution.quantile(1 - target)
      : distribution.quantile(target) - (requirement.band.max ?? 0)
  return `As drawn there is ${inSetUnits(judged, clearance.nominal)}; about ${inSetUnits(judged, upToTenth(by))} ${miss === 'binds' ? 'more' : 'less'} would do`
}

/** What is still needed, rounded up to a tenth of a millimetre: the figure is an estimate, and less would not do. */
const upToTenth = (mm: number): number => Math.ceil(mm * 10 - 1e-9) / 10

/** Share of builds that keep the side of the requirement which the message speaks of. */
export function shareMeasure(judged: JudgedSet, axis: JudgedAxis): Verdict['measure'] {
  const { band } = axis.clearance.requirement
  const isRattling = missOf(judged, axis) === 'rattles'
  return {
    actual: 1 - (isRattling ? axis.rattles : axis.binds),
    limit: band.min === null && band.max === null ? 0 : judged.set.tokens.target,
    sense: 'at-least',
    unit: 'share',
  }
}

/** Findings on the axes of every fit that a rule looks at. */
export function judgeAxes(
  judged: JudgedSet,
  axes: readonly AxisName[],
  judgeOne: (fit: JudgedFit, axis: JudgedAxis) => Pick<Finding, 'severity' | 'message'>,
): readonly Finding[] {
  return judged.fits.flatMap((fit) =>
    fit.axes
      .filter((axis) => axes.includes(axis.clearance.axis))
      .map((axis) => ({
        subject: `${fit.fit.id}:${axis.clearance.axis}`,
        measure: shareMeasure(judged, axis),
        path: ['fits', fit.fit.id],
        ...judgeOne(fit, axis),
      })),
  )
}
