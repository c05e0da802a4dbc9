import { randomUUID } from 'node:crypto'
import { createClient, RefusedError, type Client, type Fetch } from '../../../shared/api/create-client.ts'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import type { Role } from '../../../shared/api/permissions.ts'
import { hashPassword } from '../../../server/features/accounts/passwords.ts'
import { Person } from '../../../server/features/accounts/person.entity.ts'
import { Membership } from '../../../server/features/teams/membership.entity.ts'
import { Team } from '../../../server/features/teams/team.entity.ts'
import type { TestServer } from './test-server.ts'

export const password = 'correct horse battery'

/** Somebody at a browser (with a cookie) or a robot (with a token). */
export interface Agent extends Client {
  readonly cookie: () => string
  /** The refusal of a call that must be refused. */
  refusal(...call: Parameters<Client['call']>): Promise<RefusedError>
}

function agentOf(server: TestServer, headers: Readonly<Record<string, string>>): Agent {
  let cookie = ''
  const send: Fetch = async (address, sent) => {
    const answer = await fetch(address, {
      ...(sent as RequestInit),
      headers: { ...sent.headers, origin: server.url, ...(cookie === '' ? {} : { cookie }), ...headers },
      redirect: 'manual',
    })
    for (const line of answer.headers.getSetCookie()) cookie = line.split(';')[0] ?? cookie
    return answer
  }
  const client = createClient(send, server.url)
  return {
    ...client,
    cookie: () => cookie,
    async refusal(endpoint, call) {
      const outcome = await client.call(endpoint, call).then(
        () => null,
        (error: unknown) => error,
      )
      if (outcome instanceof RefusedError) return outcome
      throw outcome ?? new Error(`${endpoint.name} was not refused`)
    },
  }
}

export const stranger = (server: TestServer): Agent => agentOf(server, {})

export const robot = (server: TestServer, token: string): Agent => agentOf(server, { authorization: `Bearer ${token}` })

export async function addPerson(
  server: TestServer,
  name: string,
  email = `${name}@quillfern.example`,
): Promise<string> {
  const { manager } = server.context.database
  const id = randomUUID()
  const passwordHash = await hashPassword(password, server.context.config)
  await manager.insert(Person, { id, email, name, passwordHash, digestHour: 7, createdAt: server.context.now() })
  return id
}

export async function addTeam(server: TestServer, slug: string): Promise<string> {
  const id = randomUUID()
  await server.context.database.manager.insert(Team, { id, slug, name: slug, createdAt: server.context.now() })
  return id
}

export async function addMember(server: TestServer, teamId: string, personId: string, role: Role): Promise<void> {
  await server.context.database.manager.insert(Membership, { teamId, personId, role, joinedAt: server.context.now() })
}

export async function signIn(server: TestServer, email: string, secret = password): Promise<Agent> {
  const agent = stranger(server)
  await agent.call(endpoints.signIn, { body: { email, password: secret } })
  return agent
}

export interface TestTeam {
  readonly id: string
  readonly slug: string
  readonly owner: Agent
  readonly author: Agent
  readonly reviewer: Agent
  readonly tester: Agent
  readonly viewer: Agent
}

/** A team with one person in each role, `NAME-role@quillfern.example`. */
export async function createTeam(server: TestServer, slug: string): Promise<TestTeam> {
  const id = await addTeam(server, slug)
  const join = async (role: Role): Promise<Agent> => {
    const person = await addPerson(server, `${slug}-${role}`)
    await addMember(server, id, person, role)
    return signIn(server, `${slug}-${role}@quillfern.example`)
  }
  return {
    id,
    slug,
    owner: await join('owner'),
    author: await join('author'),
    reviewer: await join('reviewer'),
    tester: await join('tester'),
    viewer: await join('viewer'),
  }
}

/** The secret of a link in the last mail to an address. */
export function linkIn(server: TestServer, to: string, path: string): string {
  const mail = server.mail.mails.findLast((candidate) => candidate.to.includes(to) && candidate.text.includes(path))
  const secret = mail === undefined ? null : new RegExp(`${path}([\\w-]{43})`).exec(mail.text)
  if (secret?.[1] === undefined) throw new Error(`no mail to ${to} has a link to ${path}`)
  return secret[1]
}
