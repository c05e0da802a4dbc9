import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import type { Role } from '../../shared/api/permissions.ts'
import type { Context } from '../context.ts'
import { hashPassword } from '../features/accounts/passwords.ts'
import { Person } from '../features/accounts/person.entity.ts'
import { Membership } from '../features/teams/membership.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import type { TeamAccess } from '../http/team-access.ts'
import { may, usualChoices } from '../../shared/api/permissions.ts'

export const demoPassword = 'fold-score-crease'

/** One person for each role of the invented studio. */
export const demoPeople: readonly { readonly name: string; readonly email: string; readonly role: Role }[] = [
  { name: 'Olive Quill', email: 'olive@quillfern.example', role: 'owner' },
  { name: 'Arlo Fern', email: 'arlo@quillfern.example', role: 'author' },
  { name: 'Rhea Marsh', email: 'rhea@quillfern.example', role: 'reviewer' },
  { name: 'Tess Reed', email: 'tess@quillfern.example', role: 'tester' },
  { name: 'Vito Moss', email: 'vito@quillfern.example', role: 'viewer' },
]

export type DemoAccess = Readonly<Record<Role, TeamAccess>>

/** Makes the studio with its people. @returns what each of them may do */
export async function seedPeople(context: Context, manager: EntityManager): Promise<DemoAccess> {
  const id = randomUUID()
  const createdAt = context.now()
  const licence =
    'Make as many as you like for yourself and for gifts, and up to fifty a year to sell. Please name Quillfern paper goods as the designer.'
  await manager.insert(Team, {
    id,
    slug: 'quillfern',
    name: 'Quillfern paper goods',
    licence,
    branchDays: 90,
    createdAt,
  })
  const team = await manager.findOneByOrFail(Team, { id })
  const passwordHash = await hashPassword(demoPassword, context.config)
  const entries = []
  for (const { name, email, role } of demoPeople) {
    const person = { id: randomUUID(), name, email, passwordHash, digestHour: 7, createdAt }
    await manager.insert(Person, person)
    await manager.insert(Membership, { teamId: id, personId: person.id, role, joinedAt: createdAt })
    const access: TeamAccess = {
      team,
      choices: usualChoices,
      role,
      caller: { kind: 'person', id: person.id, name, email },
      actor: { kind: 'person', name, personId: person.id },
      may: (action) => may(role, action, usualChoices),
    }
    entries.push([role, access] as const)
  }
  return Object.fromEntries(entries) as unknown as DemoAccess
}
