import { judgeSet, type JudgedSet } from './assembly/judge-set.ts'
import { reportFits } from './assembly/report-fits.ts'
import { reportPieces } from './assembly/report-pieces.ts'
import type { CheckOptions } from './check-options.ts'
import { engineVersion, rulesEdition } from './edition.ts'
import { addFixes } from './fixes/add-fixes.ts'
import { ImpossiblePiece } from './pieces/impossible-piece.ts'
import { canonicalJson, digestOf } from './report/digest.ts'
import type { Report, Summary, Verdict } from './report/report.ts'
import { applyRules } from './rules/apply-rules.ts'
import { rules } from './rules/rule-registry.ts'
import { caliperOf } from './stock/stock-caliper.ts'
import { readSet } from './template/read-set.ts'
import type { Problem, SetReading, TemplateSet, Tokens, Workspace } from './template/template-model.ts'

/** Counts verdicts by status and draws the sum. */
export function summarise(verdicts: readonly Verdict[], works: number): Summary {
  const count = (status: Verdict['status']): number => verdicts.filter((verdict) => verdict.status === status).length
  const fail = count('fail')
  const warn = count('warn')
  return {
    pass: count('pass'),
    info: count('info'),
    warn,
    fail,
    waived: count('waived'),
    unchecked: count('unchecked'),
    crashed: count('crashed'),
    works,
    verdict: fail > 0 ? 'fail' : warn > 0 ? 'warn' : 'pass',
  }
}

/** The tokens a set really uses, so that a change elsewhere leaves its digest alone. */
function usedInputs(set: TemplateSet): Report['inputs'] {
  const { tokens } = set
  const stockNames = new Set<string>()
  for (const piece of set.pieces.values()) {
    if (piece.stock !== null) stockNames.add(piece.stock)
    if ('layers' in piece) for (const layer of piece.layers) stockNames.add(layer.stock)
    if ('insert' in piece && piece.insert !== null) stockNames.add(piece.insert.stock)
    if ('liner' in piece && piece.liner !== null) stockNames.add(piece.liner)
    if ('covered' in piece && piece.covered !== null) stockNames.add(piece.covered)
  }
  for (const fit of set.fits) for (const paper of fit.papers) stockNames.add(paper)
  const makers = new Set([tokens.workmanship])
  for (const piece of set.pieces.values()) if (piece.workmanship !== null) makers.add(piece.workmanship)
  for (const fit of set.fits) if (fit.workmanship !== null) makers.add(fit.workmanship)
  const clearances = set.fits.flatMap((fit) =>
    fit.clearance?.name == null ? [] : [[fit.clearance.name, fit.clearance] as const],
  )
  return {
    stocks: Object.fromEntries(
      [...stockNames].flatMap((name) => {
        const stock = tokens.stocks.get(name)
        if (stock === undefined) return []
        const { nominal, halfWidth, isEstimated } = caliperOf(stock)
        return [[name, { caliper: nominal, halfWidth, grammage: stock.grammage, estimated: isEstimated }]]
      }),
    ),
    sizes: Object.fromEntries(tokens.sizes),
    clearances: Object.fromEntries(clearances),
    makers: Object.fromEntries(
      [...makers].flatMap((name) => {
        const maker = tokens.makers.get(name)
        return maker === undefined ? [] : [[name, { cut: maker.cut, score: maker.score, fence: maker.fence }]]
      }),
    ),
  }
}

function digestOfSet(set: TemplateSet, tokens: Tokens, inputs: Report['inputs'], options: CheckOptions): string {
  return digestOf({
    set: {
      name: set.name,
      title: set.title,
      family: set.family,
      sheet: set.sheet,
      mail: set.mail,
      pieces: set.pieces,
      fits: Object.fromEntries(set.fits.map((fit) => [fit.id, fit])),
      waivers: set.waivers.map(({ index: _index, ...waiver }) => canonicalJson(waiver)).toSorted(),
      steps: set.steps,
    },
    inputs,
    rules: {
      units: tokens.units,
      ruler: tokens.ruler,
      target: tokens.target,
      floor: tokens.floor,
      workmanship: tokens.workmanship,
      checks: tokens.checks,
      humidity: tokens.humidity,
    },
    options: {
      asOf: options.asOf,
      workmanship: options.workmanship ?? null,
      paper: options.paper ?? null,
      scale: options.scale ?? 1,
    },
    engine: engineVersion,
    edition: rulesEdition,
  })
}

const emptySummary: Summary = {
  pass: 0,
  info: 0,
  warn: 0,
  fail: 0,
  waived: 0,
  unchecked: 0,
  crashed: 0,
  works: 0,
  verdict: 'invalid',
}

/** A report of a set that could not be understood: its problems and nothing else. */
function invalidReport(
  reading: SetReading,
  text: string,
  workspace: Workspace,
  options: CheckOptions,
  problems: readonly Problem[],
): Report {
  const { set } = reading
  const tokens = set?.tokens ?? workspace.tokens
  const name = options.file.replace(/^.*\//, '').replace(/\.ya?ml$/, '')
  return {
    format: 'foldgauge-report/1',
    engine: engineVersion,
    rules: rulesEdition,
    asOf: options.asOf,
    file: options.file,
    set: set?.name ?? name,
    title: set?.title ?? name,
    family: set?.family ?? null,
    units: tokens.units,
    digest: digestOf({ text, options: { ...options, file: null }, engine: engineVersion }),
    workmanship: options.workmanship ?? tokens.workmanship,
    paper: options.paper ?? null,
    scale: options.scale ?? 1,
    target: tokens.target,
    floor: tokens.floor,
    ruler: tokens.ruler,
    inputs: { stocks: {}, sizes: {}, clearances: {}, makers: {} },
    errors: problems,
    pieces: {},
    fits: [],
    verdicts: [],
    summary: emptySummary,
  }
}

function reportOf(judged: JudgedSet, verdicts: readonly Verdict[]): Report {
  const { set, options } = judged
  const inputs = usedInputs(set)
  return {
    format: 'foldgauge-report/1',
    engine: engineVersion,
    rules: rulesEdition,
    asOf: options.asOf,
    file: options.file,
    set: set.name,
    title: set.title,
    family: set.family,
    units: set.tokens.units,
    digest: digestOfSet(set, set.tokens, inputs, options),
    workmanship: judged.workmanship,
    paper: options.paper ?? null,
    scale: options.scale ?? 1,
    target: set.tokens.target,
    floor: set.tokens.floor,
    ruler: set.tokens.ruler,
    inputs,
    errors: [],
    pieces: reportPieces(judged),
    fits: reportFits(judged),
    verdicts,
    summary: summarise(verdicts, judged.works),
  }
}

/** Judges a set that has been read without problems. */
export function checkSet(set: TemplateSet, options: CheckOptions): Report {
  const judged = judgeSet(set, options)
  const verdicts = applyRules(judged, rules)
  return reportOf(judged, options.fixes === true ? addFixes(judged, verdicts, rules) : verdicts)
}

const ruleNames = rules.map((rule) => rule.id)

/** Sizes left open are for sizing; a check asks for them to be sized first. */
function openProblems(reading: SetReading): readonly Problem[] {
  return reading.open.flatMap((path) =>
    reading.set === null
      ? []
      : [
          {
            code: 'size-open',
            message: `${path.join('.')} is left open.`,
            hint: 'Run foldgauge size on this set to work it out, or write the size here.',
            at: reading.set.placeOf(path),
          },
        ],
  )
}

/**
 * The engine: text in, report out. Pure, no clock, no files.
 * @param text the set as YAML
 * @param workspace tokens it is judged with; `emptyWorkspace()` for a set that stands alone
 * @returns always a report; a text that cannot be understood gives one with `errors` and the verdict `invalid`
 */
export function checkTemplate(text: string, workspace: Workspace, options: CheckOptions): Report {
  const reading = readSet(text, options.file, workspace, ruleNames)
  const problems = [
    ...workspace.problems,
    ...reading.problems,
    ...openProblems(reading),
    ...optionProblems(reading, options),
  ]
  if (problems.length > 0 || reading.set === null) return invalidReport(reading, text, workspace, options, problems)
  try {
    return checkSet(reading.set, options)
  } catch (error) {
    if (error instanceof ImpossiblePiece) {
      return invalidReport(reading, text, workspace, options, [impossible(reading.set, error)])
    }
    // A defect in one set must not take the reports of the others with it.
    const report = invalidReport(reading, text, workspace, options, [defect(reading.set, error)])
    return { ...report, summary: { ...report.summary, crashed: 1 } }
  }
}

const defect = (set: TemplateSet, error: unknown): Problem => ({
  code: 'defect',
  message: `This set could not be judged, which is a defect of Foldgauge: ${error instanceof Error ? error.message : String(error)}.`,
  hint: 'Please report it together with the set; the other sets were judged.',
  at: set.placeOf(['set']),
})

const impossible = (set: TemplateSet, { piece, message, hint, key }: ImpossiblePiece): Problem => ({
  code: 'piece-impossible',
  message,
  hint,
  at: set.placeOf(key === null ? ['pieces', piece] : ['pieces', piece, key]),
})

/** Names given on the command line must exist in the set's tokens. */
function optionProblems(reading: SetReading, options: CheckOptions): readonly Problem[] {
  const { set } = reading
  if (set === null) return []
  const missing = (word: string, name: string, known: ReadonlyMap<string, unknown>): readonly Problem[] =>
    known.has(name)
      ? []
      : [
          {
            code: `unknown-${word}`,
            message: `There is no ${word} called ${name}.`,
            hint: known.size === 0 ? 'None is defined here.' : `There are ${[...known.keys()].join(', ')}.`,
            at: set.placeOf([]),
          },
        ]
  return [
    ...(options.workmanship === undefined ? [] : missing('workmanship', options.workmanship, set.tokens.makers)),
    ...(options.paper === undefined ? [] : missing('stock', options.paper, set.tokens.stocks)),
  ]
}
