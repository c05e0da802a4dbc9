import type { Context } from '../../context.ts'
import type { TeamAccess } from '../../http/team-access.ts'
import { recordAudit } from '../upkeep/record-audit.ts'
import { Team } from './team.entity.ts'

/** Removes the team and everything in it. The audit record stays; files go after the rows that name them. */
export async function deleteTeam(context: Context, access: TeamAccess): Promise<void> {
  const { team, actor } = access
  const keys = await context.database.transaction(async (manager) => {
    const files: { key: string }[] = await manager.query(
      `select key from build_photo where team_id = $1
       union all select photo_key from template_set where team_id = $1 and photo_key is not null
       union all select published_file.key from published_file
         join publication on publication.id = published_file.publication_id
         join template_set on template_set.id = publication.set_id where template_set.team_id = $1`,
      [team.id],
    )
    await manager.delete(Team, { id: team.id })
    await recordAudit(manager, team.id, actor, {
      verb: 'deleted',
      kind: 'team',
      name: team.name,
      sentence: `deleted the team ${team.name} with everything in it`,
    })
    return files.map(({ key }) => key)
  })
  // Photographs have a thumbnail beside them.
  await context.objects.remove(keys.flatMap((key) => [key, `${key}-small`]))
}
