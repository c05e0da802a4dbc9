import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import type { FitReport, Quantity, Report } from '../../../shared/report/report.ts'
import type { Version } from '../versions/version.entity.ts'
import type { BuildInvitation } from './build-invitation.entity.ts'
import { stampOf } from './build-invitations.service.ts'

type Form = AnswerOf<(typeof buildEndpoints)['buildForm']>['form']

/** A dimension that a tester can measure on a finished piece, with what is predicted of it. */
export interface NamedDimension {
  readonly key: string
  readonly what: string
  readonly quantity: Quantity
}

const isQuantity = (value: unknown): value is Quantity =>
  typeof value === 'object' && value !== null && 'nominal' in value && 'sigma' in value

/** Inside and outside sizes of the pieces that fits are made of: what decides, and what calipers reach. */
export function namedDimensions(report: Report): readonly NamedDimension[] {
  const inFits = new Set(
    report.fits.flatMap((fit) => [fit.to, ...fit.put.split(', ').map((part) => part.replace(/^\d+ /, ''))]),
  )
  return Object.entries(report.pieces).flatMap(([piece, { inside, outside }]) =>
    inFits.has(piece)
      ? (
          [
            ['inside', inside],
            ['outside', outside],
          ] as const
        ).flatMap(([side, sizes]) =>
          Object.entries(sizes ?? {}).flatMap(([axis, quantity]) =>
            isQuantity(quantity)
              ? [{ key: `${piece}/${side}-${axis}`, what: `${piece} ${side} ${axis}`, quantity }]
              : [],
          ),
        )
      : [],
  )
}

const cautions = [
  'Mind knives and scoring tools; cut away from yourself and from others.',
  'Hot glue burns: let it cool, and follow its maker’s instructions.',
  'Small parts are not for small children.',
]

const fitWords = (fit: FitReport): Form['fits'][number] => ({
  fit: fit.id,
  put: fit.put,
  to: fit.to,
  relation: fit.relation,
})

/** What the form asks for, from the version that is built. */
export function buildForm(
  report: Report,
  version: Version,
  invitation: BuildInvitation,
  set: string,
  team: string,
): Form {
  return {
    title: report.title,
    set,
    version: version.number,
    stamp: stampOf(version.number, invitation.tester),
    units: report.units,
    team,
    note: invitation.note,
    dueOn: invitation.dueOn,
    // Go and no-go: the ends that untidy but honest work stays within.
    measure: namedDimensions(report).map(({ key, what, quantity: { nominal, min, max } }) => ({
      key,
      what,
      value: nominal,
      go: min,
      noGo: max,
    })),
    fits: report.fits.map(fitWords),
    pieces: Object.keys(report.pieces),
    cautions,
  }
}
