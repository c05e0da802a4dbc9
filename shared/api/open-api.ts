import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi'
import type { z } from 'zod'
import { engineVersion } from '../edition.ts'
import type { Endpoint } from './endpoint.ts'
import { endpointList } from './endpoint-registry.ts'
import { errorAnswerShape } from './error-answer.ts'

const contentOf = (endpoint: Endpoint): Record<string, { schema: z.ZodType }> | Record<string, object> => {
  if (endpoint.answerKind === 'json') return { 'application/json': { schema: endpoint.answer } }
  if (endpoint.answerKind === 'csv') return { 'text/csv': { schema: { type: 'string' } } }
  return { 'application/octet-stream': { schema: { type: 'string', format: 'binary' } } }
}

const refusal = (description: string) => ({
  description,
  content: { 'application/json': { schema: errorAnswerShape } },
})

const securityOf = ({ access }: Endpoint): Record<string, string[]>[] => {
  if (access.kind === 'anyone' || access.kind === 'link') return []
  if (access.kind === 'signed-in') return [{ session: [] }]
  return access.scope === null ? [{ session: [] }] : [{ session: [] }, { token: [] }]
}

function operationOf(endpoint: Endpoint): ZodOpenApiOperationObject {
  const hasBody = endpoint.body.safeParse(undefined).success === false || endpoint.bodyTypes[0] !== 'application/json'
  const requestBody = hasBody
    ? {
        requestBody: {
          required: true,
          content: Object.fromEntries(
            endpoint.bodyTypes.map((type) => [
              type,
              { schema: type === 'application/json' ? endpoint.body : { type: 'string' as const, format: 'binary' } },
            ]),
          ),
        },
      }
    : {}
  const success = Object.fromEntries(
    endpoint.statuses.map((status) => [
      String(status),
      endpoint.answerKind === 'none'
        ? { description: 'Done' }
        : { description: endpoint.summary, content: contentOf(endpoint) },
    ]),
  )
  return {
    operationId: endpoint.name,
    summary: endpoint.summary,
    tags: [endpoint.group],
    security: securityOf(endpoint),
    requestParams: { path: endpoint.params as z.ZodObject, query: endpoint.query as z.ZodObject },
    ...requestBody,
    responses: {
      ...success,
      '4XX': refusal('Refused: what is wrong, and what to do instead'),
      '5XX': refusal('A defect or a passing weakness of the server; nothing was stored'),
    },
  } as ZodOpenApiOperationObject
}

const groupWords: Readonly<Record<string, string>> = {
  Accounts: 'Signing in and out, the own account, links by mail',
  Teams: 'Teams, their members and invitations',
  Tokens: 'Keys of robots',
  Push: 'Bringing results',
  Sets: 'Template sets of a team',
  Versions: 'Versions, baselines and comparisons',
  Review: 'Comments, decisions and known failures',
  Publication: 'Labels, errata, recalls and public pages',
  'Number sheet': 'Measures for the editor to tick',
  'Test builds': 'Testers, their reports, predicted against measured',
  Notices: 'What people are told',
  Webhooks: 'What programs are told',
  Audit: 'Who did what',
  Retention: 'How long versions are kept',
  Papers: 'Measured thicknesses',
  Upkeep: 'Work that failed',
  Health: 'For monitors and generators of clients',
}

/** The OpenAPI document of every endpoint. */
export function openApiDocument(): object {
  const paths: Record<string, Record<string, ZodOpenApiOperationObject>> = {}
  for (const endpoint of endpointList) {
    const path = (paths[endpoint.path] ??= {})
    path[endpoint.method] = operationOf(endpoint)
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Foldgauge',
      version: engineVersion,
      description: 'The record of what was checked, who approved it and what was published.',
    },
    servers: [{ url: '/' }],
    tags: [...new Set(endpointList.map(({ group }) => group))].map((name) => ({
      name,
      description: groupWords[name] ?? name,
    })),
    paths: paths as ZodOpenApiPathsObject,
    components: {
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: 'foldgauge' },
        token: { type: 'http', scheme: 'bearer' },
      },
    },
  })
}
