import type { Report } from '../../../shared/report/report.ts'
import type { BaselineReason } from './version.entity.ts'

/** A version that might be compared with. */
export interface Candidate {
  readonly id: string
  readonly number: number
  readonly verdict: Report['summary']['verdict']
  readonly isRecalled: boolean
}

/** What is known when a version is pushed. */
export interface BaselineFacts {
  readonly branch: string
  readonly mainBranch: string
  readonly pinned: (Candidate & { readonly by: string | null }) | null
  readonly published: (Candidate & { readonly label: string }) | null
  /** Of the main branch, at the commit where the branch left it. */
  readonly mergeBase: (Candidate & { readonly commit: string }) | null
  /** Of the main branch, at the nearest commit before this one. */
  readonly ancestor: (Candidate & { readonly commit: string }) | null
  readonly latestOfMain: Candidate | null
  readonly latestOfBranch: Candidate | null
}

export interface Baseline {
  readonly versionId: string | null
  readonly number: number | null
  readonly reason: BaselineReason
  readonly sentence: string
  readonly by: string | null
}

/** Whether a version can be compared with at all: it can be read, and makers are not told to stop using it. */
const isEligible = (candidate: Candidate | null): boolean =>
  candidate !== null && candidate.verdict !== 'invalid' && !candidate.isRecalled

const short = (commit: string): string => commit.slice(0, 10)

/**
 * Chooses what a version is compared with, and why. On the main branch what makers have (published) counts; on another
 * branch what it left from does, so that the work of others does not look like one's own.
 */
export function chooseBaseline(facts: BaselineFacts): Baseline {
  const { branch, mainBranch, pinned, published, mergeBase, ancestor, latestOfMain, latestOfBranch } = facts
  const of = (
    candidate: Candidate | null,
    reason: BaselineReason,
    why: string,
    by: string | null = null,
  ): Baseline | null =>
    candidate === null || !isEligible(candidate)
      ? null
      : {
          versionId: candidate.id,
          number: candidate.number,
          reason,
          sentence: `compared with version ${String(candidate.number)}: ${why}`,
          by,
        }
  const byPublished = of(published, 'published', `published as ${published?.label ?? ''}`)
  const byMergeBase = of(
    mergeBase,
    'merge-base',
    `where the branch left ${mainBranch} (${short(mergeBase?.commit ?? '')})`,
  )
  const byAncestor = of(
    ancestor,
    'ancestor',
    `the nearest earlier commit of ${mainBranch} (${short(ancestor?.commit ?? '')})`,
  )
  const byMain = of(latestOfMain, 'main-branch', `the latest of ${mainBranch}`)
  const byPin = of(pinned, 'pinned', 'pinned', pinned?.by ?? null)
  const inOrder =
    branch === mainBranch
      ? [byPin, byPublished, byAncestor, byMain]
      : [
          byPin,
          byMergeBase,
          byAncestor,
          byMain,
          byPublished,
          of(latestOfBranch, 'same-branch', `the version before it on ${branch}`),
        ]
  return (
    inOrder.find((choice) => choice !== null) ?? {
      versionId: null,
      number: null,
      reason: 'none',
      sentence: 'there is no earlier version to compare with',
      by: null,
    }
  )
}
