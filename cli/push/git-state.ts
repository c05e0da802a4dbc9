import { spawnSync } from 'node:child_process'
import { limits } from '../../shared/api/limits.ts'
import type { Io } from '../io.ts'

export interface GitState {
  readonly branch: string | null
  readonly commit: string | null
  /** Nearest first. */
  readonly ancestors: string[]
  readonly mergeBase: string | null
}

const git = (cwd: string, words: readonly string[]): string | null => {
  const result = spawnSync('git', [...words], { cwd, encoding: 'utf8', maxBuffer: 16 * 1024 * 1024 })
  const text = result.status === 0 ? result.stdout.trim() : ''
  return text === '' ? null : text
}

/** Pipelines check out a commit without its branch and say the branch in their environment. */
function branchOf(io: Io): string | null {
  const named =
    io.env['GITHUB_HEAD_REF'] || io.env['GITHUB_REF_NAME'] || io.env['CI_COMMIT_REF_NAME'] || io.env['BRANCH_NAME']
  if (named !== undefined && named !== '') return named
  return git(io.cwd, ['symbolic-ref', '--quiet', '--short', 'HEAD'])
}

/** The pipeline that this runs in, as its own address. */
export function pipelineLink(io: Io): string | null {
  const { GITHUB_SERVER_URL: server, GITHUB_REPOSITORY: repository, GITHUB_RUN_ID: run, CI_JOB_URL: job } = io.env
  if (server !== undefined && repository !== undefined && run !== undefined)
    return `${server}/${repository}/actions/runs/${run}`
  return job ?? null
}

/** Where the work tree stands in its history; nulls outside of git. */
export function readGitState(io: Io, mainBranch: string): GitState {
  const commit = git(io.cwd, ['rev-parse', 'HEAD'])
  if (commit === null) return { branch: null, commit: null, ancestors: [], mergeBase: null }
  const branch = branchOf(io)
  const all = git(io.cwd, ['rev-list', `--max-count=${String(limits.ancestors + 1)}`, 'HEAD'])?.split('\n') ?? []
  const base = (name: string): string | null => git(io.cwd, ['merge-base', 'HEAD', name])
  return {
    branch,
    commit,
    ancestors: all.slice(1),
    mergeBase: branch === mainBranch ? null : (base(`origin/${mainBranch}`) ?? base(mainBranch)),
  }
}

/** True where files that git knows differ from the commit: the push would not be what the commit says. */
export const hasChanges = (io: Io): boolean => git(io.cwd, ['status', '--porcelain', '--untracked-files=no']) !== null
