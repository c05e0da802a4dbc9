import { todayOf, type Context } from '../../context.ts'
import { judge, readTokens } from '../versions/judge.ts'
import type { ReviewState, Version } from '../versions/version.entity.ts'
import { textsOf } from '../versions/version.repository.ts'
import { Publication } from './publication.entity.ts'

/** Something that stands between a version and publication. Only a missing approval can be overridden, with a reason. */
export interface Blocker {
  readonly code: 'failing' | 'unreadable' | 'changed' | 'published' | 'unapproved'
  readonly sentence: string
}

const approvalWords: Readonly<Record<ReviewState, string | null>> = {
  none: 'nobody has approved it',
  asked: 'its review is not decided, or only its author has approved it',
  stale: 'the approval was for an earlier text, other tokens or another engine',
  'changes-asked': 'changes are asked for',
  approved: null,
}

/** What keeps a version from being published today: its waivers may have ended since it was pushed. */
export async function blockersOf(context: Context, version: Version): Promise<readonly Blocker[]> {
  const { manager } = context.database
  const published = await manager.findOneBy(Publication, { versionId: version.id })
  if (published !== null) return [{ code: 'published', sentence: `it is published as ${published.label} already` }]
  if (version.verdict === 'invalid') return [{ code: 'unreadable', sentence: 'it cannot be read' }]
  const { text, workspace, content } = await textsOf(manager, version.id)
  const { workmanship, paper, scale } = content
  const judging = { asOf: todayOf(context), workmanship, paper, scale }
  const today = await judge(text, version.file, readTokens(workspace), judging)
  const failing = today.report.verdicts.filter(({ status }) => status === 'fail' || status === 'crashed')
  const blockers: Blocker[] = []
  if (failing.length > 0)
    blockers.push({
      code: 'failing',
      sentence: `${String(failing.length)} ${failing.length === 1 ? 'check fails' : 'checks fail'} today, first ${failing[0]?.fingerprint ?? ''}`,
    })
  if (today.content !== version.content)
    blockers.push({ code: 'changed', sentence: 'the engine is another than it was judged by; push it again' })
  const words = approvalWords[version.reviewState]
  if (words !== null) blockers.push({ code: 'unapproved', sentence: words })
  return blockers
}
