// Fills an empty database with the demo team and its history. Does nothing where the team exists.
import { fileURLToPath } from 'node:url'
import { randomUUID } from 'node:crypto'
import type { BuildReport } from '../../shared/api/shapes/build-shapes.ts'
import { readConfig } from '../config.ts'
import { createDataSource } from '../db/data-source.ts'
import { migrate } from '../db/migrate.ts'
import { namedDimensions } from '../features/builds/build-form.ts'
import { inviteTester } from '../features/builds/build-invitations.service.ts'
import { Build } from '../features/builds/build.entity.ts'
import { measuresOf } from '../features/numbers/measures.ts'
import { NumberTick } from '../features/numbers/number-tick.entity.ts'
import { publish } from '../features/publication/publish.service.ts'
import { storePush } from '../features/push/push.service.ts'
import { addComment, askReview, decide } from '../features/review/review.service.ts'
import { TemplateSet } from '../features/sets/template-set.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import { PaperReading } from '../features/upkeep/paper-reading.entity.ts'
import { getVersion, textsOf } from '../features/versions/version.repository.ts'
import type { WorkContext } from '../jobs/job-handler.ts'
import { createBoss, createJobQueue } from '../jobs/job-queue.ts'
import { drainJobs } from '../jobs/run-worker.ts'
import { createLog } from '../log.ts'
import { createMailer } from '../mail/mailer.ts'
import { createObjectStore } from '../storage/object-store.ts'
import { demoHistory } from './seed-history.ts'
import { seedPeople, type DemoAccess } from './seed-people.ts'

const day = 86_400_000
const demoFolder = fileURLToPath(new URL('../../shared/demo', import.meta.url))

/** What testers measured: a spread that follows the figures predicted, always the same. */
function readingsOf(report: Parameters<typeof namedDimensions>[0], tester: number): BuildReport['readings'] {
  return namedDimensions(report).map(({ key, quantity }, index) => {
    const swing = Math.sin(tester * 12.9898 + index * 78.233)
    const value = quantity.nominal + quantity.sigma * swing * 1.4
    return { key, values: [value - 0.05, value + 0.05].map((reading) => Math.round(Math.max(reading, 0.05) * 20) / 20) }
  })
}

async function seedBuilds(context: WorkContext, access: DemoAccess, number: number): Promise<void> {
  const { manager } = context.database
  const { set, version } = await getVersion(manager, access.owner.team.id, 'fern-notes', number)
  const { report } = (await textsOf(manager, version.id)).content
  const given = {
    name: 'Tess Reed',
    email: 'tess@quillfern.example',
    note: 'Please use the thickest card you have.',
    dueOn: null,
    days: 60,
  }
  await inviteTester(context, access.author, set, version, given)
  for (const [index, tester] of ['Bram', 'Cora', 'Dunja', 'Emil'].entries())
    await manager.insert(Build, {
      id: randomUUID(),
      teamId: set.teamId,
      versionId: version.id,
      stamp: `v${String(number)}-import`,
      tester,
      source: 'import',
      report: {
        scaleBar: { x: 100, y: 100, nominal: 100 },
        sheet: 'a4',
        printer: '',
        paper: { name: 'Meadow smooth cover', grammage: 270, thickness: [0.32, 0.33, 0.32] },
        tools: 'ruler, craft knife, bone folder',
        skill: 'some',
        minutes: 55 + index * 10,
        sheetsWasted: index % 2,
        readings: readingsOf(report, index),
        fits: report.fits.map(({ id }) => ({
          fit: id,
          felt: index === 2 ? ('tight' as const) : ('good' as const),
          note: '',
        })),
        problems: [],
        note: '',
      } as never,
      startedAt: context.now(),
      submittedAt: context.now(),
    })
  const measures = measuresOf(report)
  await manager.insert(
    NumberTick,
    measures.slice(0, Math.ceil(measures.length / 2)).map(({ key, value }) => ({
      versionId: version.id,
      key,
      value,
      state: 'ticked' as const,
      note: '',
      tickedBy: 'Rhea Marsh',
      tickedAt: context.now(),
      carriedFrom: null,
    })),
  )
}

async function seedReview(context: WorkContext, access: DemoAccess, number: number): Promise<void> {
  const { set, version } = await getVersion(context.database.manager, access.owner.team.id, 'fern-notes', number)
  await askReview(context, access.author, set, version, 'Ready for the winter fair.')
  await addComment(context, access.reviewer, version, {
    anchor: { kind: 'fit', name: 'lid-on-base' },
    body: 'Built one at home: the lid slides down by itself, which is what we want.',
  })
  const { content } = version
  await decide(context, access.reviewer, set, version, { decision: 'approve', note: '', content, overrideReason: null })
  const approved = await getVersion(context.database.manager, access.owner.team.id, 'fern-notes', number)
  await publish(context, access.owner, set, approved.version, {
    label: '1.0.0',
    notes: 'First edition.',
    overrideReason: null,
  })
}

async function seed(
  context: WorkContext,
  work: () => Promise<number>,
  moveTo: (daysAgo: number) => void,
): Promise<void> {
  const { manager } = context.database
  moveTo(45)
  const access = await context.database.transaction((inner) => seedPeople(context, inner))
  for (const [index, { daysAgo, body }] of demoHistory(demoFolder).entries()) {
    moveTo(daysAgo)
    await storePush(context, access.author, body)
    await work()
    if (index === 1) {
      await seedReview(context, access, 2)
      await work()
    }
  }
  moveTo(5)
  const shown = await manager.findOneByOrFail(TemplateSet, { teamId: access.owner.team.id, name: 'fern-notes' })
  await manager.update(TemplateSet, { id: shown.id }, { tags: ['winter', 'boxed'] })
  await seedBuilds(context, access, 4)
  await manager.insert(PaperReading, {
    id: randomUUID(),
    teamId: access.owner.team.id,
    stock: 'meadow-270',
    method: 'stack-of-ten',
    readings: [0.318, 0.321, 0.319, 0.322, 0.32],
    note: 'New delivery.',
    measuredBy: 'Arlo Fern',
    createdAt: context.now(),
  })
  await work()
}

const config = readConfig(process.env)
const database = await createDataSource(config.DATABASE_URL, 4).initialize()
await migrate(database)
if (await database.manager.existsBy(Team, { slug: 'quillfern' })) await database.destroy()
else {
  const boss = createBoss(database, { migrate: false, isWorking: false })
  await boss.start()
  let offset = 0
  const objects = createObjectStore(config)
  await objects.makeReady()
  const mailer = createMailer(config)
  const context: WorkContext = {
    config,
    database,
    jobs: createJobQueue(boss),
    objects,
    mailer,
    log: createLog('warn'),
    now: () => new Date(Date.now() - offset),
  }
  await seed(
    context,
    () => drainJobs(boss, context),
    (daysAgo) => (offset = daysAgo * day),
  )
  await boss.stop({ graceful: false, close: false })
  mailer.close()
  objects.close()
  await database.destroy()
}
