import { parse } from 'csv-parse/sync'
import type { BuildReport } from '../../../shared/api/shapes/build-shapes.ts'
import { buildReportShape, feels } from '../../../shared/api/shapes/build-shapes.ts'
import { limits } from '../../../shared/api/limits.ts'

/** Columns of a sheet of readings: one row for each reading, or for how a fit felt. */
export const sheetTitles = ['tester', 'key', 'units', 'reading 1', 'reading 2', 'reading 3', 'felt', 'note'] as const

export type Separator = ',' | ';' | '\t'
export type Decimal = '.' | ','

export interface SheetProblem {
  readonly line: number
  readonly column: string
  readonly message: string
}

export interface SheetReading {
  readonly separator: Separator
  readonly decimal: Decimal
  readonly units: 'mm' | 'in'
  readonly rows: number
  readonly builds: ReadonlyMap<string, BuildReport>
  readonly preview: readonly { line: number; tester: string; key: string; written: string; read: string }[]
  readonly problems: readonly SheetProblem[]
}

export interface SheetNames {
  readonly dimensions: ReadonlySet<string>
  readonly fits: ReadonlySet<string>
}

interface Row {
  readonly line: number
  readonly cells: Readonly<Record<string, string>>
}

/** The separator that the title line has most of; a sheet of one column would be read as nonsense, so none is a problem. */
function guessSeparator(text: string): Separator | null {
  const first = text.split(/\r?\n/, 1)[0] ?? ''
  const counts = ([',', ';', '\t'] as const).map((separator) => ({
    separator,
    count: first.split(separator).length - 1,
  }))
  const best = counts.toSorted((a, b) => b.count - a.count)[0]
  return best === undefined || best.count === 0 ? null : best.separator
}

const numberPattern = { '.': /^\d{1,5}(?:\.\d+)?$/, ',': /^\d{1,5}(?:,\d+)?$/ } as const

/** The decimal mark of the sheet: the one that its readings have; both at once cannot be told apart. */
function guessDecimal(readings: readonly string[]): Decimal | null {
  const hasPoint = readings.some((reading) => reading.includes('.'))
  const hasComma = readings.some((reading) => reading.includes(','))
  if (hasPoint && hasComma) return null
  return hasComma ? ',' : '.'
}

function readRows(text: string, separator: Separator): readonly Row[] | SheetProblem {
  try {
    const records = parse<{ record: string[]; info: { lines: number } }>(text, {
      bom: true,
      delimiter: separator,
      info: true,
      relax_column_count: true,
      skip_empty_lines: true,
      trim: true,
      max_record_size: 100_000,
    } as never) as unknown as { record: string[]; info: { lines: number } }[]
    const [titles, ...rest] = records
    const names = (titles?.record ?? []).map((title) => title.toLowerCase())
    return rest.map(({ record, info }) => ({
      line: info.lines,
      cells: Object.fromEntries(names.map((name, index) => [name, record[index] ?? ''])),
    }))
  } catch (error) {
    const line = (error as { lines?: unknown }).lines
    return {
      line: typeof line === 'number' ? line : 1,
      column: '',
      message: error instanceof Error ? error.message : 'cannot be read',
    }
  }
}

const readingColumns = ['reading 1', 'reading 2', 'reading 3'] as const
const perUnit = { mm: 1, in: 25.4 } as const

/** Reads one sheet of readings; every problem has its line, and where there is one nothing may be stored. */
export function readBuildSheet(
  text: string,
  names: SheetNames,
  given: {
    readonly separator?: Separator | undefined
    readonly decimal?: Decimal | undefined
    readonly units?: 'mm' | 'in' | undefined
  },
): SheetReading {
  const problems: SheetProblem[] = []
  const separator = given.separator ?? guessSeparator(text)
  const rows =
    separator === null
      ? { line: 1, column: '', message: 'there is only one column: no comma, semicolon or tab in the first line' }
      : readRows(text, separator)
  const empty = {
    separator: separator ?? ',',
    decimal: given.decimal ?? '.',
    units: given.units ?? 'mm',
    rows: 0,
    builds: new Map(),
    preview: [],
  } as const
  if ('message' in rows) return { ...empty, problems: [rows] }
  const columns = new Set(Object.keys(rows[0]?.cells ?? {}))
  for (const title of ['tester', 'key'] as const)
    if (!columns.has(title)) problems.push({ line: 1, column: title, message: `there is no column “${title}”` })
  if (rows.length === 0) problems.push({ line: 1, column: '', message: 'there are no rows' })
  if (rows.length > limits.rowsPerImport)
    problems.push({
      line: limits.rowsPerImport + 2,
      column: '',
      message: `there are more than ${String(limits.rowsPerImport)} rows`,
    })
  if (problems.length > 0) return { ...empty, rows: rows.length, problems }
  const readings = rows.flatMap(({ cells }) =>
    readingColumns.map((column) => cells[column] ?? '').filter((cell) => cell !== ''),
  )
  const decimal = given.decimal ?? guessDecimal(readings)
  if (decimal === null)
    return {
      ...empty,
      rows: rows.length,
      problems: [
        {
          line: 1,
          column: 'reading 1',
          message: 'some readings have a decimal point and some a decimal comma; say which it is',
        },
      ],
    }
  const written = new Set(rows.map(({ cells }) => (cells['units'] ?? '').toLowerCase()).filter((cell) => cell !== ''))
  const units = given.units ?? (written.size === 1 ? [...written][0] : undefined)
  if (units !== 'mm' && units !== 'in')
    return {
      ...empty,
      decimal,
      rows: rows.length,
      problems: [
        { line: 2, column: 'units', message: 'say whether readings are mm or in, the same for the whole sheet' },
      ],
    }
  if ([...written].some((unit) => unit !== units))
    problems.push({ line: 2, column: 'units', message: `rows give other units than ${units}` })
  const drafts = new Map<string, { readings: BuildReport['readings']; fits: BuildReport['fits'] }>()
  const preview: SheetReading['preview'][number][] = []
  for (const { line, cells } of rows) readRow(line, cells)

  function readRow(line: number, cells: Row['cells']): void {
    const [tester = '', key = '', felt = ''] = [cells['tester'], cells['key'], cells['felt']]
    if (tester === '' || tester.length > limits.name) {
      problems.push({ line, column: 'tester', message: 'the name of the tester is missing or too long' })
      return
    }
    const draft = drafts.get(tester) ?? { readings: [], fits: [] }
    drafts.set(tester, draft)
    if (names.fits.has(key)) {
      const feel = feels.find((known) => known === felt)
      if (feel === undefined)
        problems.push({ line, column: 'felt', message: `“${felt}” is none of ${feels.join(', ')}` })
      else draft.fits.push({ fit: key, felt: feel, note: (cells['note'] ?? '').slice(0, limits.reason) })
      return
    }
    if (!names.dimensions.has(key)) {
      problems.push({ line, column: 'key', message: `this version has no dimension or fit “${key}”` })
      return
    }
    const values: number[] = []
    for (const column of readingColumns) {
      const cell = cells[column] ?? ''
      if (cell === '') continue
      if (!numberPattern[decimal ?? '.'].test(cell)) {
        problems.push({
          line,
          column,
          message: `“${cell}” is not a number with decimal ${decimal === ',' ? 'comma' : 'point'}`,
        })
        continue
      }
      const number = Number(cell.replace(',', '.'))
      const millimetres = number * perUnit[units as 'mm' | 'in']
      if (!(millimetres > 0 && millimetres <= 5_000))
        problems.push({ line, column, message: `“${cell}” is no length of a piece` })
      else {
        values.push(millimetres)
        if (preview.length < 5)
          preview.push({ line, tester, key, written: cell, read: `${String(number)} ${String(units)}` })
      }
    }
    if (values.length === 0) {
      if (readingColumns.every((column) => (cells[column] ?? '') === ''))
        problems.push({ line, column: 'reading 1', message: 'there is no reading' })
      return
    }
    if (draft.readings.some((reading) => reading.key === key))
      problems.push({ line, column: 'key', message: `${tester} has ${key} twice` })
    else draft.readings.push({ key, values })
  }

  const builds = new Map(
    [...drafts].map(([tester, draft]) => [
      tester,
      buildReportShape.parse({ scaleBar: { x: null, y: null }, paper: {}, ...draft }),
    ]),
  )
  return {
    separator: separator ?? ',',
    decimal,
    units,
    rows: rows.length,
    builds,
    preview,
    problems: problems.slice(0, 200),
  }
}
