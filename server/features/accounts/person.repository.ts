import type { EntityManager } from 'typeorm'
import type { Role } from '../../../shared/api/permissions.ts'
import { Person } from './person.entity.ts'

export const findPersonByEmail = (manager: EntityManager, email: string): Promise<Person | null> =>
  manager.findOneBy(Person, { email })

export const findPerson = (manager: EntityManager, id: string): Promise<Person | null> =>
  manager.findOneBy(Person, { id })

export interface OwnTeam {
  readonly slug: string
  readonly name: string
  readonly role: Role
}

/** The teams of a person by name. */
export const teamsOf = (manager: EntityManager, personId: string): Promise<OwnTeam[]> =>
  manager.query(
    `select team.slug, team.name, membership.role from membership
     join team on team.id = membership.team_id where membership.person_id = $1 order by lower(team.name), team.slug`,
    [personId],
  )
