import { createConfig, lintFromString } from '@redocly/openapi-core'
import { describe, expect, it } from 'vitest'
import { createClient, RefusedError, type Fetch } from '../../../shared/api/create-client.ts'
import { endpointList, endpoints } from '../../../shared/api/endpoint-registry.ts'
import { openApiDocument } from '../../../shared/api/open-api.ts'
import { addressOf } from '../../../shared/api/request-parts.ts'

describe('the OpenAPI document', () => {
  it('is valid to a linter', async () => {
    const config = await createConfig({
      extends: ['minimal'],
      // The licence of the project is its owner's to choose, and the server has no address of its own.
      rules: {
        'info-license': 'off',
        'no-server-example.com': 'off',
        'operation-4xx-response': 'error',
        'no-unused-components': 'error',
      },
    } as never)
    const problems = await lintFromString({ source: JSON.stringify(openApiDocument()), config })
    expect(problems.map(({ message, location }) => `${message} ${location[0]?.pointer ?? ''}`)).toEqual([])
  })

  it('has every endpoint under its own name', () => {
    const { paths } = openApiDocument() as { paths: Record<string, Record<string, { operationId: string }>> }
    const names = Object.values(paths).flatMap((path) => Object.values(path).map(({ operationId }) => operationId))
    expect(names.toSorted()).toEqual(endpointList.map(({ name }) => name).toSorted())
  })
})

describe('endpoints', () => {
  it('declare a parameter for each brace of their path', () => {
    for (const { name, path, params } of endpointList) {
      const braces = [...path.matchAll(/\{(\w+)\}/g)].map(([, word]) => word)
      expect([name, Object.keys((params as unknown as { shape: object }).shape).toSorted()]).toEqual([
        name,
        braces.toSorted(),
      ])
    }
  })

  it('page every list that can grow without end', () => {
    const growing = [
      endpoints.sets,
      endpoints.versions,
      endpoints.audit,
      endpoints.notices,
      endpoints.builds,
      endpoints.deliveries,
    ]
    for (const { query } of growing)
      expect(Object.keys(query.shape)).toEqual(expect.arrayContaining(['cursor', 'limit']))
  })
})

describe('the client', () => {
  const answering =
    (status: number, text: string): Fetch =>
    () =>
      Promise.resolve({ ok: status < 400, status, headers: { get: () => null }, text: () => Promise.resolve(text) })

  it('writes names into paths so that nothing in them can break out', () => {
    expect(addressOf(endpoints.set, { params: { team: 'home', set: '../a b?' } })).toBe(
      '/api/teams/home/sets/..%2Fa%20b%3F',
    )
    expect(addressOf(endpoints.sets, { params: { team: 'home' }, query: { search: 'a&b', limit: 5 } })).toBe(
      '/api/teams/home/sets?search=a%26b&limit=5',
    )
  })

  it('tells a refusal of the server from an answer of something between', async () => {
    const refusal = { error: { code: 'forbidden', message: 'No.', hint: null, problems: [], requestId: 'abc' } }
    const call = (fetch: Fetch) =>
      createClient(fetch)
        .call(endpoints.me)
        .catch((error: unknown) => error)
    expect(await call(answering(403, JSON.stringify(refusal)))).toMatchObject({
      status: 403,
      code: 'forbidden',
      message: 'No.',
    })
    expect(await call(answering(502, '<html>Bad gateway</html>'))).toMatchObject({
      status: 502,
      code: 'strange-answer',
    })
    const away = await call(() => Promise.reject(new Error('refused')))
    expect(away).toBeInstanceOf(RefusedError)
    expect(away).toMatchObject({ status: 0, code: 'unreachable' })
  })
})
