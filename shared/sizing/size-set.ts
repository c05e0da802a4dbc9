import { modelOptionsOf } from '../assembly/judge-set.ts'
import type { CheckOptions } from '../check-options.ts'
import { checkTemplate } from '../check-template.ts'
import type { BoxGiven } from '../pieces/box/box-given.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { Report } from '../report/report.ts'
import { readSet } from '../template/read-set.ts'
import type { TemplateSet, Workspace } from '../template/template-model.ts'
import type { Ruler } from '../units/units.ts'
import { openPieces, type OpenPiece } from './open-pieces.ts'
import { sizeBox, type SizedPiece, type Unsizable } from './size-box.ts'
import { sizeEnvelope } from './size-envelope.ts'
import { sizeBag, sizeInsert } from './size-flat.ts'
import type { ChosenSize, Infeasible, Sizing, SizingAlternative } from './sizing.ts'
import { writeSizes } from './write-sizes.ts'

interface Solved {
  readonly set: TemplateSet
  readonly chosen: readonly ChosenSize[]
  readonly area: number
}

type Outcome = Solved | (Unsizable & { readonly piece: string })

const isUnsizable = (value: object): value is Unsizable => 'message' in value

/** The set with only those fits whose pieces all have their sizes. */
function trialSet(set: TemplateSet, waiting: ReadonlySet<string>, current: string): TemplateSet {
  const isReady = (name: string): boolean => name === current || !waiting.has(name)
  return {
    ...set,
    fits: set.fits.filter(
      (fit) =>
        isReady(fit.to) &&
        fit.put.every((entry) => isReady(entry.piece)) &&
        (fit.holding === null || isReady(fit.holding)),
    ),
  }
}

/** A strip that is reckoned from what it goes round needs no size of its own. */
const reckoned = (given: PieceGiven): SizedPiece<PieceGiven> | Unsizable =>
  (given.kind === 'band' || given.kind === 'sleeve') && given.around !== null
    ? { given: { ...given, blank: null }, chosen: [] }
    : {
        requirement: `size of ${given.name}`,
        message: `sizing does not work out a ${given.kind}`,
        nearest: `give the size of ${given.name}; sizing goes from the inside out`,
      }

function sizeOne(
  whole: TemplateSet,
  trial: TemplateSet,
  options: CheckOptions,
  given: PieceGiven,
): SizedPiece<PieceGiven> | Unsizable {
  const at = { set: trial, options: modelOptionsOf(whole, options) }
  switch (given.kind) {
    case 'box':
    case 'lid':
      return sizeBox(whole, at, given)
    case 'envelope':
      return given.style === 'baronial' && given.by === 'corners' ? reckoned(given) : sizeEnvelope(whole, at, given)
    case 'insert':
    case 'divider':
      return sizeInsert(whole, at, given)
    case 'bag':
      return sizeBag(whole, at, given)
    case 'band':
    case 'sleeve':
    case 'card':
    case 'bought':
    case 'custom':
      return reckoned(given)
  }
}

/** Forward substitution from the inside out; each part is sized from the rounded ones before it. @see physics L (derived) */
function solve(set: TemplateSet, open: readonly OpenPiece[], options: CheckOptions): Outcome {
  const waiting = new Set(open.map((piece) => piece.name))
  const chosen: ChosenSize[] = []
  let whole = set
  for (const { name } of open) {
    const given = whole.pieces.get(name)
    if (given === undefined) continue
    let sized: SizedPiece<PieceGiven> | Unsizable
    try {
      sized = sizeOne(whole, trialSet(whole, waiting, name), options, given)
    } catch (error) {
      if (!(error instanceof RangeError)) throw error
      sized = { requirement: `size of ${name}`, message: error.message, nearest: null }
    }
    if (isUnsizable(sized)) return { ...sized, piece: name }
    whole = { ...whole, pieces: new Map([...whole.pieces, [name, sized.given]]) }
    chosen.push(...sized.chosen)
    waiting.delete(name)
  }
  return { set: whole, chosen, area: areaOf(whole, open) }
}

/** Paper in the blanks that were sized, mm². */
function areaOf(set: TemplateSet, open: readonly OpenPiece[]): number {
  return open.reduce((sum, { name }) => {
    const given = set.pieces.get(name)
    if (given === undefined) return sum
    if ((given.kind === 'box' || given.kind === 'lid') && given.by.given === 'blank' && given.by.blank !== 'fit')
      return sum + given.by.blank.length * given.by.blank.width
    if (given.kind === 'envelope' && given.style === 'baronial' && given.by === 'corners')
      return sum + given.square * given.square
    if (given.kind === 'envelope' && given.style === 'square-flap' && given.pocket !== 'fit')
      return sum + given.pocket.length * given.pocket.width * 2.5
    return sum
  }, 0)
}

const isSolved = (outcome: Outcome): outcome is Solved => 'area' in outcome

const turned = (set: TemplateSet, names: readonly string[]): TemplateSet => ({
  ...set,
  pieces: new Map(
    [...set.pieces].map(([name, given]) => {
      if (!names.includes(name) || (given.kind !== 'box' && given.kind !== 'lid')) return [name, given]
      const at: BoxGiven['tabs']['at'] = given.tabs.at === 'ends' ? 'sides' : 'ends'
      return [name, { ...given, tabs: { ...given.tabs, at } }]
    }),
  ),
})

const withRuler = (set: TemplateSet, ruler: Ruler): TemplateSet => ({ ...set, tokens: { ...set.tokens, ruler } })

const inch = 25.4
const rulers: readonly { readonly title: string; readonly ruler: Ruler }[] = [
  { title: 'half-millimetre marks', ruler: { cut: 0.5, score: 0.5 } },
  { title: 'millimetre marks', ruler: { cut: 1, score: 1 } },
  { title: 'inches: cut on sixteenths, score on eighths', ruler: { cut: inch / 16, score: inch / 8 } },
  { title: 'inches: cut and score on sixteenths', ruler: { cut: inch / 16, score: inch / 16 } },
  { title: 'inches: cut and score on thirty-seconds', ruler: { cut: inch / 32, score: inch / 32 } },
]

function alternativeOf(title: string, outcome: Outcome): SizingAlternative {
  return isSolved(outcome)
    ? {
        title,
        area: outcome.area,
        sizes: outcome.chosen.map(({ piece, what, value }) => ({ piece, what, value })),
        slack: Math.max(0, ...outcome.chosen.map(({ value, unrounded }) => value - unrounded)),
      }
    : { title, area: null, sizes: [], slack: null }
}

/** The same task with tabs turned and on other rulers. */
function alternativesOf(
  set: TemplateSet,
  open: readonly OpenPiece[],
  options: CheckOptions,
): readonly SizingAlternative[] {
  const boxes = open.filter(({ name }) => ['box', 'lid'].includes(set.pieces.get(name)?.kind ?? ''))
  const own = set.tokens.ruler
  return [
    ...boxes.map(({ name }) => alternativeOf(`tabs of ${name} turned`, solve(turned(set, [name]), open, options))),
    ...rulers
      .filter(({ ruler }) => Math.abs(ruler.cut - own.cut) > 1e-6 || Math.abs(ruler.score - own.score) > 1e-6)
      .map(({ title, ruler }) => alternativeOf(title, solve(withRuler(set, ruler), open, options))),
  ]
}

/** A report that fails although every least size was met: an upper limit, a sheet or a strict requirement is broken. */
function infeasibleOf(
  report: Report,
  open: readonly OpenPiece[],
  alternatives: readonly SizingAlternative[],
): Infeasible | null {
  const failing = report.verdicts.find((verdict) => verdict.status === 'fail' || verdict.status === 'crashed')
  if (failing === undefined) return null
  const finer = alternatives.find(
    (alternative) => alternative.slack !== null && alternative.title.includes('marks') && alternative.slack < 0.5,
  )
  return {
    piece: open[0]?.name ?? report.set,
    requirement: failing.subject,
    message: `the least sizes that meet every lower limit break another: ${failing.message}`,
    nearest:
      finer === undefined
        ? 'widen that requirement, or use thinner paper'
        : `widen that requirement, use thinner paper, or allow ${finer.title}`,
  }
}

const nothing = { chosen: [], text: null, report: null, area: 0, alternatives: [] } as const

/**
 * Works out every size a set leaves open, least first, on the ruler's marks, and checks what comes out.
 * @returns the sizes with what limits each and the set's text with them written in; or why there are none
 */
export function sizeSet(text: string, workspace: Workspace, options: CheckOptions): Sizing {
  const reading = readSet(text, options.file, workspace)
  const problems = [...workspace.problems, ...reading.problems]
  if (reading.set === null || problems.length > 0) return { ...nothing, infeasible: null, problems }
  const set = reading.set
  const open = openPieces(set, reading.open)
  if (open.length === 0)
    return { ...nothing, text, report: checkTemplate(text, workspace, options), infeasible: null, problems: [] }
  const outcome = solve(set, open, options)
  if (!isSolved(outcome)) {
    const { piece, requirement, message, nearest } = outcome
    return { ...nothing, infeasible: { piece, requirement, message, nearest }, problems: [] }
  }
  const written = open.reduce((current, piece) => {
    const given = outcome.set.pieces.get(piece.name)
    return given === undefined ? current : writeSizes(current, given, piece, set.tokens.units)
  }, text)
  const report = checkTemplate(written, workspace, options)
  const alternatives = alternativesOf(set, open, options)
  return {
    chosen: outcome.chosen,
    text: written,
    report,
    area: outcome.area,
    alternatives,
    infeasible:
      report.summary.verdict === 'invalid'
        ? {
            piece: open[0]?.name ?? set.name,
            requirement: '',
            message: report.errors[0]?.message ?? 'the sized set cannot be read',
            nearest: report.errors[0]?.hint ?? null,
          }
        : infeasibleOf(report, open, alternatives),
    problems: [],
  }
}
