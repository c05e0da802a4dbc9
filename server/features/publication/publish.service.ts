import { randomUUID } from 'node:crypto'
import { IsNull } from 'typeorm'
import type { BodyOf } from '../../../shared/api/endpoint.ts'
import type { publicationEndpoints } from '../../../shared/api/publication-endpoints.ts'
import { isUniqueViolation } from '../../db/unique-violation.ts'
import type { Context } from '../../context.ts'
import { conflict, found, unacceptable } from '../../http/refusal.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { announce, setPage } from '../notices/announce.ts'
import type { TemplateSet } from '../sets/template-set.entity.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { compareVersions } from '../versions/compare-versions.service.ts'
import { Version } from '../versions/version.entity.ts'
import { blockersOf } from './blockers.ts'
import { Erratum } from './erratum.entity.ts'
import { compareLabels } from './labels.ts'
import { highestPublication } from './proposal.service.ts'
import { Publication } from './publication.entity.ts'

type Bodies = typeof publicationEndpoints

/** Publishes a version. @throws Refusal 409 for a label that is taken or too low, 422 with everything in the way */
export async function publish(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  version: Version,
  given: BodyOf<Bodies['publish']>,
): Promise<Publication> {
  const { team, actor } = access
  const blockers = await blockersOf(context, version)
  const inTheWay = blockers.filter(({ code }) => code !== 'unapproved' || given.overrideReason === null)
  if (inTheWay.length > 0)
    throw unacceptable(
      'not-publishable',
      `Version ${String(version.number)} of ${set.name} cannot be published: ${inTheWay.map(({ sentence }) => sentence).join('; ')}.`,
      blockers.every(({ code }) => code === 'unapproved')
        ? 'Have it approved, or give a reason to publish it without.'
        : null,
      inTheWay.map(({ code, sentence }) => ({ path: code, message: sentence, line: null })),
    )
  const highest = await highestPublication(context, set.id)
  if (highest !== null && compareLabels(given.label, highest.label) <= 0)
    throw conflict('label-too-low', `${given.label} does not come after ${highest.label}.`, 'Labels only rise.')
  const id = randomUUID()
  const isOverridden = blockers.length > 0
  try {
    await context.database.transaction(async (manager) => {
      await manager.insert(Publication, {
        id,
        setId: set.id,
        versionId: version.id,
        number: version.number,
        label: given.label,
        notes: given.notes,
        licence: team.licence,
        overrideReason: isOverridden ? given.overrideReason : null,
        publishedBy: actor.name,
        publishedAt: context.now(),
      })
      await context.jobs.add(
        manager,
        'render-exports',
        { publicationId: id },
        { teamId: team.id, about: `exports of ${set.name} ${given.label}` },
      )
      const why = isOverridden ? ` without approval, because: ${given.overrideReason ?? ''}` : ''
      await recordAudit(manager, team.id, actor, {
        verb: 'published',
        kind: 'version',
        name: `${set.name} ${given.label}`,
        sentence: `published ${set.name} version ${String(version.number)} as ${given.label}${why}`,
      })
      await announce(context, manager, {
        teamId: team.id,
        event: 'published',
        subject: `Published: ${set.title} ${given.label}`,
        sentence: `${actor.name} published version ${String(version.number)} of ${set.title} as ${given.label}.`,
        page: setPage(team, set.name, version.number),
        by: actor.personId,
        data: { set: set.name, version: version.number, label: given.label },
      })
    })
  } catch (error) {
    if (isUniqueViolation(error, 'publication_label')) throw conflict('label-taken', `${given.label} is taken.`)
    if (isUniqueViolation(error, 'publication_version'))
      throw conflict('published', 'This version is published already.')
    throw error
  }
  return found(await context.database.manager.findOneBy(Publication, { id }))
}

/** Stops new use of a publication: nothing disappears. */
export async function recall(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  label: string,
  reason: string,
): Promise<Publication> {
  const { team, actor } = access
  return context.database.transaction(async (manager) => {
    const publication = found(await manager.findOneBy(Publication, { setId: set.id, label }))
    const done = await manager.update(
      Publication,
      { id: publication.id, recalledAt: IsNull() },
      { recalledAt: context.now(), recallReason: reason, recalledBy: actor.name },
    )
    if (done.affected !== 1) throw conflict('recalled', `${label} is recalled already.`)
    await recordAudit(manager, team.id, actor, {
      verb: 'recalled',
      kind: 'version',
      name: `${set.name} ${label}`,
      sentence: `recalled ${set.name} ${label}: ${reason}`,
    })
    await announce(context, manager, {
      teamId: team.id,
      event: 'recalled',
      subject: `Recalled: ${set.title} ${label}`,
      sentence: `${actor.name} recalled ${set.title} ${label}: ${reason}`,
      page: setPage(team, set.name, publication.number),
      by: actor.personId,
      data: { set: set.name, label },
    })
    return found(await manager.findOneBy(Publication, { id: publication.id }))
  })
}

/** Tells makers what is wrong, and whether pieces they have made still mate with the mended ones. */
export async function addErratum(
  context: Context,
  access: TeamAccess,
  set: TemplateSet,
  given: BodyOf<Bodies['addErratum']>,
): Promise<Erratum> {
  const { team, actor } = access
  const { manager: reader } = context.database
  const published = await reader.findBy(Publication, { setId: set.id })
  const labels = new Map(published.map((publication) => [publication.label, publication]))
  const unknown = [...given.labels, ...(given.replacement === null ? [] : [given.replacement])].filter(
    (label) => !labels.has(label),
  )
  if (unknown.length > 0)
    throw unacceptable(
      'no-such-label',
      `${set.name} has no ${unknown.join(', ')}.`,
      `There are ${[...labels.keys()].join(', ') || 'none yet'}.`,
    )
  const oldest = labels.get(given.labels.toSorted(compareLabels)[0] ?? '')
  const mended = given.replacement === null ? null : labels.get(given.replacement)
  const versions =
    oldest === undefined || mended == null
      ? null
      : await Promise.all([oldest, mended].map(({ versionId }) => reader.findOneBy(Version, { id: versionId })))
  const [before, after] = versions ?? [null, null]
  const compared = before == null || after == null ? null : (await compareVersions(context, before, after)).comparison
  const id = randomUUID()
  return context.database.transaction(async (manager) => {
    await manager.insert(Erratum, {
      ...given,
      id,
      setId: set.id,
      oldPiecesMate: compared?.oldPiecesMate ?? null,
      mating: compared?.matings.map(({ sentence }) => sentence) ?? [],
      writtenBy: actor.name,
      createdAt: context.now(),
    })
    await recordAudit(manager, team.id, actor, {
      verb: 'reported',
      kind: 'erratum',
      name: `${set.name} ${given.labels.join(', ')}`,
      sentence: `wrote an erratum for ${set.name} ${given.labels.join(', ')}: ${given.symptom}`,
    })
    await announce(context, manager, {
      teamId: team.id,
      event: 'erratum',
      subject: `Erratum: ${set.title}`,
      sentence: `${set.title} ${given.labels.join(', ')}: ${given.symptom}`,
      page: setPage(team, set.name),
      by: actor.personId,
      data: { set: set.name, label: given.labels.join(', ') },
    })
    return found(await manager.findOneBy(Erratum, { id }))
  })
}
