import { readFileSync } from 'node:fs'

/** Rows of a small CSV file by column name; quoted fields may hold commas. */
export function readCsv(url: URL): readonly Readonly<Record<string, string>>[] {
  const [header = [], ...rows] = readFileSync(url, 'utf8').trim().split(/\r?\n/).map(fieldsOf)
  return rows.map((row) => Object.fromEntries(header.map((name, index) => [name, row[index] ?? ''])))
}

const fieldsOf = (line: string): readonly string[] =>
  [...line.matchAll(/("((?:[^"]|"")*)"|[^,]*)(?:,|$)/g)]
    .slice(0, -1)
    .map((match) => (match[2] ?? match[1] ?? '').replaceAll('""', '"'))
