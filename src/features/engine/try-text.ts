import { checkSet, checkTemplate } from '../../../shared/check-template.ts'
import type { CheckOptions } from '../../../shared/check-options.ts'
import type { Report } from '../../../shared/report/report.ts'
import { rules } from '../../../shared/rules/rule-registry.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import type { TemplateSet } from '../../../shared/template/template-model.ts'
import { workspaceOf, type WorkspaceText } from './judge-text.ts'

/** What is tried besides the text. */
export interface Trial {
  readonly paper: string | null
  readonly maker: string | null
  /** Print scale, 1 for true size. */
  readonly scale: number
  /** One paper as if it were of another thickness, millimetres. */
  readonly thickness: { readonly stock: string; readonly caliper: number } | null
}

export interface Tried {
  readonly report: Report
  readonly papers: readonly { readonly name: string; readonly caliper: number | null }[]
  readonly makers: readonly string[]
  readonly workmanship: string
  /** How long judging took, milliseconds. */
  readonly took: number
}

/** The set with one paper thinner or thicker; its tolerance grows alike. */
function withThickness(set: TemplateSet, { stock, caliper }: NonNullable<Trial['thickness']>): TemplateSet {
  const own = set.tokens.stocks.get(stock)
  if (own === undefined) return set
  const share = own.caliper === null || own.caliperHalfWidth === null ? null : own.caliperHalfWidth / own.caliper
  const changed = { ...own, caliper, caliperHalfWidth: share === null ? own.caliperHalfWidth : share * caliper }
  return { ...set, tokens: { ...set.tokens, stocks: new Map([...set.tokens.stocks, [stock, changed]]) } }
}

const ruleNames = rules.map(({ id }) => id)

/** Judges a text as if cut from other paper, by other hands or printed at another scale. */
export function tryText(text: string, given: WorkspaceText | null, file: string, asOf: string, trial: Trial): Tried {
  const began = performance.now()
  const workspace = workspaceOf(given)
  const options: CheckOptions = {
    file,
    asOf,
    fixes: false,
    ...(trial.paper === null ? {} : { paper: trial.paper }),
    ...(trial.maker === null ? {} : { workmanship: trial.maker }),
    ...(trial.scale === 1 ? {} : { scale: trial.scale }),
  }
  const reading = readSet(text, file, workspace, ruleNames)
  const isClear = reading.set !== null && reading.problems.length === 0 && workspace.problems.length === 0
  const judge = (): Report => {
    if (trial.thickness !== null && isClear && reading.set !== null && reading.open.length === 0) {
      try {
        return checkSet(withThickness(reading.set, trial.thickness), options)
      } catch {
        // A piece cannot be folded so: the whole check says which.
      }
    }
    return checkTemplate(text, workspace, options)
  }
  const report = judge()
  const tokens = reading.set?.tokens ?? workspace.tokens
  return {
    report,
    papers: [...tokens.stocks.values()].map(({ name, caliper }) => ({ name, caliper })),
    makers: [...tokens.makers.keys()],
    workmanship: tokens.workmanship,
    took: performance.now() - began,
  }
}
