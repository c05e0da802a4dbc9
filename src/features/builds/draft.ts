import type { BuildReport } from '../../../shared/api/shapes/build-shapes.ts'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import type { RulerUnit } from '../../../shared/units/units.ts'
import { millimetresPerInch } from '../../../shared/units/format-length.ts'
import { readLength } from '../../lib/units.ts'
import { buildWords } from '../../words/build-words.ts'

export type FormAnswer = AnswerOf<typeof buildEndpoints.buildForm>
export type Feel = BuildReport['fits'][number]['felt']

/** The form as it is typed: text, so that half a number is kept too. */
export interface Draft {
  units: RulerUnit
  barX: string
  barY: string
  nominal: string
  sheet: string
  printer: string
  paperName: string
  grammage: string
  thickness: { text: string }[]
  tools: string
  skill: '' | 'first-time' | 'some' | 'experienced'
  minutes: string
  wasted: string
  readings: { values: { text: string }[] }[]
  fits: { felt: '' | Feel; note: string }[]
  problems: { piece: string; edge: string; expected: string; got: string }[]
  note: string
}

const written = (mm: number | null | undefined, units: RulerUnit): string =>
  mm == null ? '' : String(Number((units === 'mm' ? mm : mm / millimetresPerInch).toFixed(4)))

const filled = (values: readonly string[], count: number): { text: string }[] =>
  Array.from({ length: count }, (_, index) => ({ text: values[index] ?? '' }))

/** What the form begins with: what was kept, else paper and tools of the last build. */
export function draftOf({ form, build, last }: FormAnswer, units: RulerUnit): Draft {
  const report = build?.report
  const usual = report ?? last
  const text = (mm: number | null | undefined): string => written(mm, units)
  return {
    units,
    barX: text(report?.scaleBar.x),
    barY: text(report?.scaleBar.y),
    nominal: text(report?.scaleBar.nominal ?? 100),
    sheet: usual?.sheet ?? '',
    printer: usual?.printer ?? '',
    paperName: usual?.paper.name ?? '',
    grammage: usual?.paper.grammage == null ? '' : String(usual.paper.grammage),
    thickness: filled((usual?.paper.thickness ?? []).map(text), 5),
    tools: usual?.tools ?? '',
    skill: usual?.skill ?? '',
    minutes: report?.minutes == null ? '' : String(report.minutes),
    wasted: report?.sheetsWasted == null ? '' : String(report.sheetsWasted),
    readings: form.measure.map(({ key }) => ({
      values: filled((report?.readings.find((reading) => reading.key === key)?.values ?? []).map(text), 3),
    })),
    fits: form.fits.map(({ fit }) => {
      const felt = report?.fits.find((own) => own.fit === fit)
      return { felt: felt?.felt ?? '', note: felt?.note ?? '' }
    }),
    problems: (report?.problems ?? []).map((problem) => ({ ...problem })),
    note: report?.note ?? '',
  }
}

export interface ReadDraft {
  readonly report: BuildReport
  /** What is no length or number; those readings are left out of the report. */
  readonly problems: readonly string[]
}

/** Reads what was typed. Nothing is guessed: what cannot be read is named. */
export function readDraft(draft: Draft, form: FormAnswer['form']): ReadDraft {
  const problems: string[] = []
  const length = (text: string, what: string): number | null => {
    if (text.trim() === '') return null
    const mm = readLength(text, draft.units)
    if (mm === null || mm <= 0) problems.push(buildWords.bad(what))
    return mm === null || mm <= 0 ? null : mm
  }
  const whole = (text: string, what: string): number | null => {
    if (text.trim() === '') return null
    if (/^\d{1,6}$/.test(text.trim())) return Number(text)
    problems.push(buildWords.badNumber(what))
    return null
  }
  const lengths = (texts: readonly { readonly text: string }[], what: string): number[] =>
    texts.flatMap(({ text }, index) => length(text, `${what}, ${buildWords.reading(index + 1)}`) ?? [])
  const report: BuildReport = {
    scaleBar: {
      x: length(draft.barX, buildWords.barX),
      y: length(draft.barY, buildWords.barY),
      nominal: length(draft.nominal, buildWords.nominal) ?? 100,
    },
    sheet: draft.sheet,
    printer: draft.printer,
    paper: {
      name: draft.paperName,
      grammage: whole(draft.grammage, buildWords.grammage),
      thickness: lengths(draft.thickness, buildWords.paperHeading),
    },
    tools: draft.tools,
    skill: draft.skill === '' ? null : draft.skill,
    minutes: whole(draft.minutes, buildWords.minutes),
    sheetsWasted: whole(draft.wasted, buildWords.wasted),
    readings: form.measure.flatMap(({ key, what }, index) => {
      const values = lengths(draft.readings[index]?.values ?? [], what)
      return values.length === 0 ? [] : [{ key, values }]
    }),
    fits: form.fits.flatMap(({ fit }, index) => {
      const own = draft.fits[index]
      return own === undefined || own.felt === '' ? [] : [{ fit, felt: own.felt, note: own.note }]
    }),
    problems: draft.problems.filter(({ got }) => got.trim() !== ''),
    note: draft.note,
  }
  return { report, problems }
}
