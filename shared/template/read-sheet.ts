import type { Path } from '../pieces/reading/report-problem.ts'
import type { ValueReader } from '../pieces/reading/value-reader.ts'
import { sheetByName, sheetNames } from '../stock/sheets.ts'
import { nearestName } from '../units/did-you-mean.ts'
import type { Stock } from './template-model.ts'

export type Sheet = NonNullable<Stock['sheet']>

/** Reads what paper is bought in or blanks are cut from: a sheet by name, or a size, the longer side first. */
export function readSheet(keys: Path, written: string, read: ValueReader): Sheet {
  const name = written.trim()
  const known = sheetByName(name)
  if (known !== null) return { ...known, name }
  if (/^[a-z][a-z0-9-]*$/i.test(name) && name !== 'fit') {
    const nearest = nearestName(name.toLowerCase(), sheetNames)
    read.report(
      keys,
      'unknown-sheet',
      `There is no sheet called “${name}”.`,
      nearest === null
        ? `Write one of ${sheetNames.map((sheet) => `“${sheet}”`).join(', ')}, or a size such as “420 x 297 mm”.`
        : `Did you mean “${nearest}”?`,
      'value',
    )
    return { length: NaN, width: NaN, name }
  }
  const size = read.size(keys, written)
  return { length: Math.max(size.length, size.width), width: Math.min(size.length, size.width), name }
}
