import { basename, dirname, relative } from 'node:path'
import type { AnswerOf } from '../../shared/api/endpoint.ts'
import { RefusedError, type Client } from '../../shared/api/create-client.ts'
import { limits } from '../../shared/api/limits.ts'
import { pushEndpoints } from '../../shared/api/push-endpoints.ts'
import { engineVersion, rulesEdition } from '../../shared/edition.ts'
import type { Report } from '../../shared/report/report.ts'
import { exitCode, worstExit, type ExitCode } from '../exit-code.ts'
import { findSets, type SetInput } from '../inputs/find-sets.ts'
import { workspaceFile } from '../inputs/find-workspace.ts'
import { UsageError, type Io } from '../io.ts'
import { clientOf, explainRefusal, isPassing, teamOf, waitsOf, withRetries } from '../push/connect.ts'
import { findConnection, type Connection } from '../push/credentials.ts'
import { hasChanges, pipelineLink, readGitState } from '../push/git-state.ts'
import { forgetPush, keepPush, keptPushes, type PushBody } from '../push/spool.ts'
import { addJudgingOptions, exitOf, judgeInputs, judgingOptions, oneOf, type JudgingOptions } from './check.ts'
import type { CommandModule } from './command-module.ts'

type Pushed = AnswerOf<(typeof pushEndpoints)['push']>

interface Options extends JudgingOptions {
  readonly server?: string
  readonly branch?: string
  readonly mainBranch: string
  readonly link?: string
  readonly failOn: string
  readonly resume?: boolean
}

/** Sets of one push share a workspace; paths are those inside of it. */
function groupByWorkspace(inputs: readonly SetInput[]): readonly (readonly SetInput[])[] {
  const groups = new Map<string | null, SetInput[]>()
  for (const input of inputs) {
    const group = groups.get(input.found.folder)
    if (group === undefined) groups.set(input.found.folder, [input])
    else group.push(input)
  }
  return [...groups.values()]
}

const inWorkspace = ({ path, found: { folder }, file }: SetInput): string => {
  if (path === null) return basename(file)
  const inside = relative(folder ?? dirname(path), path)
  return inside.startsWith('..') ? basename(path) : inside.replaceAll('\\', '/')
}

function bodyOf(
  io: Io,
  inputs: readonly SetInput[],
  reports: ReadonlyMap<SetInput, Report>,
  options: Options,
): PushBody {
  const [first] = inputs
  const text = first?.found.text ?? null
  const judging = judgingOptions(io, options)
  const state = readGitState(io, options.mainBranch)
  return {
    workspace: text === null ? null : { file: workspaceFile, text },
    sets: inputs.map((input) => {
      const report = reports.get(input)
      return {
        file: inWorkspace(input),
        text: input.text,
        digest: report?.digest ?? null,
        verdict: report?.summary.verdict ?? null,
      }
    }),
    engine: engineVersion,
    rules: rulesEdition,
    judging: {
      asOf: judging.asOf,
      workmanship: judging.workmanship ?? null,
      paper: judging.paper ?? null,
      scale: judging.scale ?? 1,
    },
    branch: options.branch ?? state.branch,
    commit: state.commit,
    ancestors: state.ancestors,
    mergeBase: state.mergeBase,
    link: options.link ?? pipelineLink(io),
  }
}

const percent = (share: number): string => `${String(Math.floor(share * 100))} of 100 builds work`

function tellPushed(io: Io, server: string, pushed: Pushed): void {
  for (const set of pushed.sets) {
    const state = set.isNew ? `version ${String(set.number)}` : `version ${String(set.number)}, there already`
    io.out(
      `${set.set}: ${state}, ${set.verdict}, ${percent(set.works)}; ${set.baseline.sentence}\n  ${server}${set.page}\n`,
    )
    if (set.differs !== null) io.err(`foldgauge: ${set.set}: ${set.differs}\n`)
  }
  if (pushed.ripple.length > 0)
    io.err(
      `Other sets of the workspace are judged again with its tokens: ${pushed.ripple.map(({ set }) => set).join(', ')}\n`,
    )
}

/** Sends one push; one that cannot be sent for now is kept. */
async function send(io: Io, connection: Connection, client: Client, body: PushBody): Promise<ExitCode> {
  const tell = (message: string): void => io.err(`foldgauge: ${message}`)
  try {
    const pushed = await withRetries(
      async () => client.call(pushEndpoints.push, { params: { team: await teamOf(client) }, body }),
      waitsOf(io.env),
      tell,
    )
    tellPushed(io, connection.server, pushed)
    return exitCode.clean
  } catch (error) {
    if (!(error instanceof RefusedError)) throw error
    io.err(`foldgauge push: ${explainRefusal(error, connection.server)}`)
    if (isPassing(error)) {
      const file = keepPush(io, connection.server, body)
      io.err(`The push is kept in ${file}; foldgauge push --resume sends it.\n`)
    }
    return exitCode.pushFailed
  }
}

async function resume(io: Io, connection: Connection, client: Client): Promise<ExitCode> {
  const kept = keptPushes(io, connection.server)
  if (kept.length === 0) io.err(`Nothing is kept for ${connection.server}.\n`)
  const codes: ExitCode[] = []
  for (const push of kept) {
    const code = await send(io, connection, client, push.body)
    if (code === exitCode.clean) forgetPush(push)
    codes.push(code)
  }
  return worstExit([exitCode.clean, ...codes])
}

export const pushCommand: CommandModule = {
  define(command) {
    command
      .argument('[paths...]', 'sets, folders or patterns; default: the workspace here')
      .option('--server <address>', 'where to push (default: FOLDGAUGE_SERVER, then the last login)')
      .option('--branch <name>', 'branch this belongs to (default: from git, or from the pipeline)')
      .option('--main-branch <name>', 'branch that others leave from and return to', 'main')
      .option('--link <address>', 'pipeline or page this came from')
      .option(
        '--fail-on <what>',
        'what makes the exit code 1 although the push went through: fail, warn, never',
        'fail',
      )
      .option('--resume', 'send what could not be sent before')
    addJudgingOptions(command)
    command.addHelpText(
      'after',
      '\nThe token comes from FOLDGAUGE_TOKEN or from foldgauge login, never from an option.\nExit 3: the checks ran, the push did not.',
    )
  },

  async execute(io, words, given) {
    const options = given as unknown as Options
    const failOn = oneOf('--fail-on', options.failOn, ['fail', 'warn', 'never'])
    const connection = findConnection(io, options.server)
    const client = clientOf(connection)
    if (options.resume === true) return resume(io, connection, client)
    const inputs = await findSets(words, io)
    const reports = judgeInputs(io, inputs, judgingOptions(io, options))
    for (const { errors } of reports)
      for (const { at, message, hint } of errors)
        io.err(`${at.file}:${String(at.line)}:${String(at.column)}: ${message}\n  ${hint}\n`)
    const checked = exitOf(reports, failOn === 'warn' ? 'warn' : 'fail')
    if (checked === exitCode.unusable || checked === exitCode.defect) return checked
    if (hasChanges(io)) io.err('foldgauge: the work tree differs from its commit; what is pushed is the work tree.\n')
    const reportOf = new Map(
      inputs.flatMap((input, index) => (reports[index] === undefined ? [] : [[input, reports[index]] as const])),
    )
    const codes: ExitCode[] = []
    for (const group of groupByWorkspace(inputs)) {
      if (group.length > limits.setsPerPush)
        throw new UsageError(
          `${String(group.length)} sets are more than one push takes (${String(limits.setsPerPush)})`,
          'Push them in parts, a folder at a time.',
        )
      codes.push(await send(io, connection, client, bodyOf(io, group, reportOf, options)))
    }
    return worstExit([failOn === 'never' ? exitCode.clean : checked, ...codes])
  },
}
