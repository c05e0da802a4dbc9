import { setImmediate } from 'node:timers/promises'
import { checkTemplate } from '../../../shared/check-template.ts'
import { digestOf } from '../../../shared/report/digest.ts'
import type { Report } from '../../../shared/report/report.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import type { Workspace } from '../../../shared/template/template-model.ts'

/** How versions are judged besides their texts. */
export interface Judging {
  readonly asOf: string
  readonly workmanship: string | null
  readonly paper: string | null
  readonly scale: number
}

export interface Judged {
  readonly report: Report
  /** Digest of what was judged without the day: what an approval binds to. */
  readonly content: string
  /** Equal for two versions that say the same: content, text and the status of every verdict. */
  readonly identity: string
}

export const readTokens = (source: { readonly file: string; readonly text: string } | null): Workspace =>
  source === null ? emptyWorkspace() : readWorkspace(source.text, source.file)

/** What was judged without the day: the set as it was read, the tokens it uses, engine and options. */
function contentOf(text: string, file: string, workspace: Workspace, judging: Judging, report: Report): string {
  const { set } = readSet(text, file, workspace)
  const { workmanship, paper, scale } = judging
  const common = { workmanship, paper, scale, engine: report.engine, rules: report.rules }
  if (set === null) return digestOf({ text, common })
  const { name, title, family, sheet, mail, pieces, fits, waivers, steps, tokens } = set
  const { units, ruler, target, floor, checks, humidity } = tokens
  return digestOf({
    set: { name, title, family, sheet, mail, pieces, fits, waivers, steps },
    inputs: report.inputs,
    tokens: { units, ruler, target, floor, workmanship: tokens.workmanship, checks, humidity },
    common,
  })
}

/** The one place where the server calls the engine. Gives other requests a turn first: a check keeps the thread. */
export async function judge(text: string, file: string, workspace: Workspace, judging: Judging): Promise<Judged> {
  await setImmediate()
  const report = checkTemplate(text, workspace, {
    file,
    asOf: judging.asOf,
    ...(judging.workmanship === null ? {} : { workmanship: judging.workmanship }),
    ...(judging.paper === null ? {} : { paper: judging.paper }),
    ...(judging.scale === 1 ? {} : { scale: judging.scale }),
  })
  const content = contentOf(text, file, workspace, judging, report)
  const statuses = report.verdicts.map(({ fingerprint, status }) => `${fingerprint}=${status}`).toSorted()
  const identity = digestOf({ text, content, statuses, errors: report.errors.map(({ code }) => code) })
  return { report, content, identity }
}
