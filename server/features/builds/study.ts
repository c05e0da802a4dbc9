import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { feels, type BuildReport } from '../../../shared/api/shapes/build-shapes.ts'
import type { Report } from '../../../shared/report/report.ts'
import { fittingInterval, meanInterval, measure, toleranceFactor } from '../../../shared/uncertainty/measured-builds.ts'
import { namedDimensions, type NamedDimension } from './build-form.ts'

type Study = AnswerOf<(typeof buildEndpoints)['study']>

export interface ReportedBuild {
  readonly stamp: string
  readonly report: BuildReport
}

/** Fewer say nothing of the mean; fewer than the second nothing of the spread. */
const forInterval = 3
const forSpread = 10

const policy =
  'Under three builds only the readings are shown; from three their mean with its 95 % interval; from ten the standard deviation and the interval that holds 95 of 100 builds with 95 % confidence.'

/** How much larger than meant the tester's page was printed; readings of pieces made from it are divided by it. */
function printedScale({ scaleBar: { x, y, nominal } }: BuildReport): number {
  const bars = [x, y].filter((bar) => bar !== null)
  return bars.length === 0 ? 1 : bars.reduce((sum, bar) => sum + bar, 0) / bars.length / nominal
}

function studyDimension(
  { key, what, quantity }: NamedDimension,
  builds: readonly ReportedBuild[],
  isPrinted: boolean,
): Study['dimensions'][number] {
  const points = builds.flatMap(({ stamp, report }) => {
    const values = report.readings.find((reading) => reading.key === key)?.values
    const mean = values === undefined ? null : (measure(values)?.mean ?? null)
    // Pieces that makers measure out themselves do not follow the printer.
    return mean === null ? [] : [{ build: stamp, mean, corrected: isPrinted ? mean / printedScale(report) : mean }]
  })
  const measured = measure(points.map(({ corrected }) => corrected))
  const { nominal, sigma, min, max } = quantity
  const hasInterval = measured !== null && measured.count >= forInterval
  const hasSpread = measured !== null && measured.count >= forSpread
  const interval = hasInterval ? meanInterval(measured) : null
  const reach = hasSpread ? toleranceFactor(measured.count) * measured.deviation : 0
  const isInside = interval !== null && interval.low <= nominal && nominal <= interval.high
  return {
    key,
    what,
    predicted: { nominal, sigma, min, max },
    points,
    n: points.length,
    mean: measured?.mean ?? null,
    bias: measured === null ? null : measured.mean - nominal,
    interval: interval === null ? null : { low: interval.low, high: interval.high },
    deviation: hasSpread ? measured.deviation : null,
    tolerance: hasSpread ? { low: measured.mean - reach, high: measured.mean + reach } : null,
    reading: interval === null ? 'too-few' : isInside ? 'agrees' : 'biased',
  }
}

function studyFit(fit: Report['fits'][number], builds: readonly ReportedBuild[]): Study['fits'][number] {
  const felt = builds.flatMap(({ report }) =>
    report.fits.filter((reported) => reported.fit === fit.id).map((reported) => reported.felt),
  )
  const went = felt.filter((feel) => feel !== 'will-not-go').length
  return {
    fit: fit.id,
    predicted: fit.closes,
    n: felt.length,
    went,
    atLeast: felt.length < forInterval ? null : fittingInterval(went, felt.length).low,
    felt: Object.fromEntries(
      feels.map((feel) => [feel, felt.filter((given) => given === feel).length]),
    ) as Study['fits'][number]['felt'],
  }
}

/** What was predicted against what builds measured; a constant bias means a wrong allowance, spread that making varies. */
export function studyOf(report: Report, builds: readonly ReportedBuild[]): Study {
  return {
    builds: builds.length,
    dimensions: namedDimensions(report).map((dimension) => {
      const piece = report.pieces[dimension.key.slice(0, dimension.key.lastIndexOf('/'))]
      return studyDimension(dimension, builds, piece?.made === 'printed')
    }),
    fits: report.fits.map((fit) => studyFit(fit, builds)),
    policy,
  }
}
