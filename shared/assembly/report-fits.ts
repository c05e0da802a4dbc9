import { shares } from '../uncertainty/moments.ts'
import { quantityOf } from '../report/quantity.ts'
import type { AxisReport, FitReport } from '../report/report.ts'
import type { JudgedAxis } from './judge-axis.ts'
import type { JudgedFit } from './judge-fit.ts'
import type { JudgedSet } from './judge-set.ts'
import { scaleWindow } from './scale-window.ts'

function reportAxis(axis: JudgedAxis): AxisReport {
  const { clearance, requirement } = axis.clearance
  return {
    axis: axis.clearance.axis,
    clearance: quantityOf(clearance),
    perSide: clearance.nominal / 2,
    required: requirement.band,
    requirementFrom: requirement.from,
    binds: axis.binds,
    rattles: axis.rattles,
    sources: shares(clearance),
    verdict: axis.verdict,
    strict: requirement.isStrict,
  }
}

const putOf = ({ fit }: JudgedFit): string =>
  fit.isStack ? fit.put.map((entry) => `${String(entry.count)} ${entry.piece}`).join(', ') : (fit.put[0]?.piece ?? '')

function reportFit(judged: JudgedSet, judgedFit: JudgedFit): FitReport {
  const { fit, seat, give, clearances } = judgedFit
  return {
    id: fit.id,
    relation: fit.relation,
    put: putOf(judgedFit),
    to: fit.to,
    holding: fit.holding,
    count: fit.count,
    turned: judgedFit.isTurned,
    closes: judgedFit.closes,
    dependsOnCare: judgedFit.dependsOnCare,
    verdict: judgedFit.verdict,
    axes: judgedFit.axes.map(reportAxis),
    give:
      give === null ? null : { axis: give.axis.clearance.axis, name: give.name, goesTo: give.goesTo, bow: give.bow },
    seat: seat === null ? null : { z: seat.z.nominal, exposed: seat.exposed },
    scale: judged.options.scales === true ? scaleWindow(judged, judgedFit) : null,
    papers: (judged.papers.get(fit.id) ?? []).map((trial) => ({
      stock: trial.stock,
      verdict: trial.judged.verdict,
      closes: trial.judged.closes,
    })),
    pack: clearances.load?.pack ?? null,
    workmanship: judged.options.workmanship ?? fit.workmanship ?? judged.workmanship,
  }
}

/** Every fit of a set as reported, in the order of the file. */
export const reportFits = (judged: JudgedSet): readonly FitReport[] => judged.fits.map((fit) => reportFit(judged, fit))
