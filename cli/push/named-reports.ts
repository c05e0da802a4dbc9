import { RefusedError } from '../../shared/api/create-client.ts'
import { versionEndpoints } from '../../shared/api/version-endpoints.ts'
import { checkTemplate } from '../../shared/check-template.ts'
import type { CheckOptions } from '../../shared/check-options.ts'
import type { Report } from '../../shared/report/report.ts'
import { emptyWorkspace, readWorkspace } from '../../shared/template/read-workspace.ts'
import { UsageError, type Io } from '../io.ts'
import { clientOf, explainRefusal, teamOf, waitsOf, withRetries } from './connect.ts'
import { findConnection } from './credentials.ts'

/**
 * What the server has of sets under a name, `published` or `branch:NAME`, judged by this engine as the sets themselves are: so no difference of
 * engines or days gets into a comparison. Sets that the server does not have are left out.
 */
export async function namedReports(
  io: Io,
  word: string,
  sets: readonly string[],
  judging: Omit<CheckOptions, 'file'>,
): Promise<readonly Report[]> {
  const connection = findConnection(io, undefined)
  const client = clientOf(connection)
  const query = word === 'published' ? { published: 'true' as const } : { branch: word.slice('branch:'.length) }
  const tell = (message: string): void => io.err(`foldgauge: ${message}`)
  const reports: Report[] = []
  try {
    const team = await withRetries(() => teamOf(client), waitsOf(io.env), tell)
    for (const set of sets) {
      const call = () => client.call(versionEndpoints.versionNamed, { params: { team, set }, query })
      const version = await withRetries(call, waitsOf(io.env), tell).catch((error: unknown) => {
        if (error instanceof RefusedError && error.status === 404) return null
        throw error
      })
      if (version === null) continue
      const { text, workspace, number } = version
      const tokens = workspace === null ? emptyWorkspace() : readWorkspace(workspace.text, workspace.file)
      reports.push(checkTemplate(text, tokens, { ...judging, file: `${set} version ${String(number)}` }))
    }
  } catch (error) {
    if (error instanceof RefusedError)
      throw new UsageError(`--against ${word}: ${explainRefusal(error, connection.server).trimEnd()}`)
    throw error
  }
  return reports
}
