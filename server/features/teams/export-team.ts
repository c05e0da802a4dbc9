import { Readable } from 'node:stream'
import type { Context } from '../../context.ts'
import { fileAnswer, type FileAnswer } from '../../http/answers.ts'
import type { TeamAccess } from '../../http/team-access.ts'

/** Tables with what belongs to a team, and how they find it. Secrets and their digests stay behind. */
const parts: readonly (readonly [name: string, sql: string])[] = [
  ['team', `select * from team where id = $1`],
  [
    'members',
    `select person.name, person.email, membership.role, membership.joined_at from membership join person on person.id = membership.person_id where team_id = $1 order by person.id`,
  ],
  ['sets', `select * from template_set where team_id = $1 order by name`],
  ['pushes', `select * from push where team_id = $1 order by created_at, id`],
  ['versions', `select * from version where team_id = $1 order by set_id, number`],
  ['contents', `select * from version_content where team_id = $1 order by version_id`],
  ['texts', `select digest, text from source_text where team_id = $1 order by digest`],
  ['comments', `select * from comment where team_id = $1 order by created_at, id`],
  [
    'decisions',
    `select decision.* from decision join template_set s on s.id = decision.set_id where s.team_id = $1 order by decision.created_at, decision.id`,
  ],
  ['known-failures', `select * from known_failure where team_id = $1 order by accepted_at, id`],
  [
    'publications',
    `select publication.* from publication join template_set s on s.id = publication.set_id where s.team_id = $1 order by publication.published_at, publication.id`,
  ],
  [
    'errata',
    `select erratum.* from erratum join template_set s on s.id = erratum.set_id where s.team_id = $1 order by erratum.created_at, erratum.id`,
  ],
  [
    'number-ticks',
    `select number_tick.* from number_tick join version v on v.id = number_tick.version_id where v.team_id = $1 order by number_tick.version_id, number_tick.key`,
  ],
  ['builds', `select * from build where team_id = $1 order by started_at, id`],
  ['photos', `select * from build_photo where team_id = $1 order by created_at, id`],
  ['papers', `select * from paper_reading where team_id = $1 order by created_at, id`],
  ['audit', `select * from audit_entry where team_id = $1 order by id`],
]

const batch = 200

/** One JSON document, written as it is read: a big team need not fit in memory. All of one moment. */
async function* writeParts(context: Context, teamId: string): AsyncGenerator<string> {
  const runner = context.database.createQueryRunner()
  await runner.connect()
  try {
    await runner.startTransaction('REPEATABLE READ')
    yield '{"format":"foldgauge-team/1"'
    for (const [index, [name, sql]] of parts.entries()) {
      yield `,\n${JSON.stringify(name)}:[`
      await runner.query(`declare part${String(index)} cursor for ${sql}`, [teamId])
      let isFirst = true
      for (;;) {
        const rows = (await runner.query(`fetch ${String(batch)} from part${String(index)}`)) as object[]
        for (const row of rows) {
          yield (isFirst ? '\n' : ',\n') + JSON.stringify(row)
          isFirst = false
        }
        if (rows.length < batch) break
      }
      yield ']'
    }
    yield '}\n'
  } finally {
    await runner.rollbackTransaction().catch(() => undefined)
    await runner.release()
  }
}

export function exportTeam(context: Context, access: TeamAccess): Promise<FileAnswer> {
  const body = Readable.from(writeParts(context, access.team.id))
  return Promise.resolve(fileAnswer('application/json', body, `${access.team.slug}.json`, 'no-store'))
}
