import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { pushEndpoints } from '../../../shared/api/push-endpoints.ts'
import { engineVersion, rulesEdition } from '../../../shared/edition.ts'
import { call } from '../../lib/api.ts'
import { today } from '../../lib/dates.ts'
import { judgeText, type WorkspaceText } from './judge-text.ts'

export type Pushed = AnswerOf<typeof pushEndpoints.push>

/** Sends sets with what this browser's engine says of them; the server judges them again. @throws RefusedError */
export function pushSets(
  team: string,
  workspace: WorkspaceText | null,
  sets: readonly { readonly file: string; readonly text: string }[],
  branch: string,
): Promise<Pushed> {
  const asOf = today()
  return call(pushEndpoints.push, {
    params: { team },
    body: {
      workspace,
      sets: sets.map(({ file, text }) => {
        const report = judgeText(text, workspace, { file, asOf })
        return { file, text, digest: report.digest, verdict: report.summary.verdict }
      }),
      engine: engineVersion,
      rules: rulesEdition,
      judging: { asOf },
      branch: branch.trim() === '' ? null : branch.trim(),
      commit: null,
    },
  })
}
