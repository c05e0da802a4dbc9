import type { WorkContext } from './job-handler.ts'

interface Waiting {
  readonly personId: string
  readonly email: string
}

interface Line {
  readonly id: string
  readonly team: string
  readonly sentence: string
  readonly page: string | null
}

/** Mails each person what gathered since their last digest, at the hour they chose; nothing where nothing did. */
export async function sendDigests(context: WorkContext): Promise<void> {
  const { database, config } = context
  const people: Waiting[] = await database.manager.query(
    `select distinct person.id as "personId", person.email from notice n join person on person.id = n.person_id
     where n.is_waiting and person.digest_hour = $1`,
    [context.now().getUTCHours()],
  )
  for (const { personId, email } of people)
    await database.transaction(async (manager) => {
      const lines: Line[] = await manager.query(
        `select n.id, team.name as team, n.sentence, n.page from notice n join team on team.id = n.team_id
         where n.person_id = $1 and n.is_waiting order by team.name, n.created_at limit 200 for update of n skip locked`,
        [personId],
      )
      if (lines.length === 0) return
      const text = lines
        .map(
          ({ team, sentence, page }) => `${team}: ${sentence}${page === null ? '' : `\n  ${config.PUBLIC_URL}${page}`}`,
        )
        .join('\n\n')
      await manager.query('update notice set is_waiting = false where id = any($1::uuid[])', [
        lines.map(({ id }) => id),
      ])
      const subject = `${String(lines.length)} ${lines.length === 1 ? 'thing' : 'things'} in your teams`
      await context.jobs.add(
        manager,
        'send-mail',
        { to: email, subject, text: `${text}\n\nChoose what you are told on each team’s page: ${config.PUBLIC_URL}\n` },
        { teamId: null, about: 'daily digest' },
      )
    })
}
