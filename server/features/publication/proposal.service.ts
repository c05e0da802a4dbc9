import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import type { Context } from '../../context.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { Build } from '../builds/build.entity.ts'
import { measuresOf } from '../numbers/measures.ts'
import { NumberTick } from '../numbers/number-tick.entity.ts'
import { Comment } from '../review/comment.entity.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { compareVersions } from '../versions/compare-versions.service.ts'
import { Version } from '../versions/version.entity.ts'
import { textsOf } from '../versions/version.repository.ts'
import { IsNull, Not } from 'typeorm'
import { blockersOf } from './blockers.ts'
import { compareLabels, nextLabel } from './labels.ts'
import { Publication } from './publication.entity.ts'

type Proposal = AnswerOf<(typeof publicationEndpoints)['proposal']>

/** The publication with the highest label. */
export async function highestPublication(context: Context, setId: string): Promise<Publication | null> {
  const all = await context.database.manager.findBy(Publication, { setId })
  return all.toSorted((a, b) => compareLabels(b.label, a.label))[0] ?? null
}

async function labelFor(
  context: Context,
  set: TemplateSet,
  version: Version,
): Promise<Pick<Proposal, 'label' | 'step' | 'why' | 'oldPiecesMate' | 'mating'>> {
  const before = await highestPublication(context, set.id)
  const old = before === null ? null : await context.database.manager.findOneBy(Version, { id: before.versionId })
  if (before === null || old === null)
    return { label: '1.0.0', step: 'first', why: 'nothing of it is published yet', oldPiecesMate: null, mating: [] }
  const { comparison } = await compareVersions(context, old, version)
  const { step, why } = comparison.proposal
  return {
    label: nextLabel(before.label, step),
    step,
    why: `against ${before.label}: ${why}`,
    oldPiecesMate: comparison.oldPiecesMate,
    mating: comparison.matings.map(({ sentence }) => sentence),
  }
}

/** Which label a version would get, what stands in the way, and what a careful publisher has done by then. */
export async function proposePublication(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  version: Version,
): Promise<Proposal> {
  const { manager } = context.database
  const { content } = await textsOf(manager, version.id)
  const ticked = await manager.countBy(NumberTick, { versionId: version.id, state: 'ticked' })
  const queried = await manager.countBy(NumberTick, { versionId: version.id, state: 'queried' })
  const measures = measuresOf(content.report).length
  const builds = await manager.countBy(Build, { versionId: version.id, submittedAt: Not(IsNull()) })
  const open = await manager.countBy(Comment, { versionId: version.id, resolvedAt: IsNull() })
  const blockers = await blockersOf(context, version)
  return {
    ...(await labelFor(context, set, version)),
    blockers: blockers.map(({ sentence }) => sentence),
    checklist: [
      {
        item: 'its check passes today',
        isDone: !blockers.some(({ code }) => code === 'failing' || code === 'unreadable'),
      },
      { item: 'it is approved', isDone: version.reviewState === 'approved' },
      { item: `all ${String(measures)} measures are ticked (${String(ticked)} so far)`, isDone: ticked >= measures },
      { item: 'no measure is queried', isDone: queried === 0 },
      { item: 'every comment is resolved', isDone: open === 0 },
      { item: `somebody has built it (${String(builds)} so far)`, isDone: builds > 0 },
      { item: 'a photograph of the finished sample is there', isDone: set.photoKey !== null },
      { item: 'the licence text is set', isDone: access.team.licence.trim() !== '' },
    ],
  }
}
