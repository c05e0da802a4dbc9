import type { EntityManager } from 'typeorm'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import type { accountEndpoints } from '../../../shared/api/account-endpoints.ts'
import type { Person } from './person.entity.ts'
import { teamsOf } from './person.repository.ts'

export async function presentMe(
  manager: EntityManager,
  person: Person,
): Promise<AnswerOf<(typeof accountEndpoints)['me']>> {
  const { id, name, email, digestHour } = person
  return { id, name, email, digestHour, teams: await teamsOf(manager, id) }
}
