import { validate } from '@hyperjump/json-schema/openapi-3-1'
import { describe, expect, it } from 'vitest'
import { allEndpoints } from '@shared/endpoints/all'
import { describeEndpoints } from '../../../../server/features/service/openapi'

const META_SCHEMA = 'https://spec.openapis.org/oas/3.1/schema-base'
/** As it travels. */
const description = JSON.parse(JSON.stringify(describeEndpoints(allEndpoints, 'tautbook'))) as {
  paths: Record<string, Record<string, { operationId: string; parameters: { name: string; in: string }[] }>>
}

describe('the OpenAPI description', () => {
  it('is valid by the OpenAPI 3.1 meta-schema, its schemas included', async () => {
    expect(await validate(META_SCHEMA, description, 'BASIC')).toEqual({ valid: true })
  })

  it('is not valid any more once a schema in it is spoilt, so that the check before means something', async () => {
    const spoilt = structuredClone(description) as unknown as {
      components: { schemas: { Problem: { type: unknown } } }
    }
    spoilt.components.schemas.Problem.type = 'objekt'
    expect((await validate(META_SCHEMA, spoilt as never)).valid).toBe(false)
  })

  it('describes every endpoint, each path parameter by its name', () => {
    const operations = Object.entries(description.paths).flatMap(([path, methods]) =>
      Object.entries(methods).map(([method, { operationId, parameters }]) => ({
        id: operationId,
        address: `${method.toUpperCase()} ${path}`,
        names: parameters.filter((each) => each.in === 'path').map(({ name }) => name),
      })),
    )
    expect(operations.map(({ id }) => id).sort()).toEqual(allEndpoints.map(({ id }) => id).sort())
    for (const { address, names } of operations) {
      expect([...address.matchAll(/\{(\w+)\}/g)].map(([, name]) => name)).toEqual(names)
    }
  })

  it('refers to nothing outside its components', () => {
    const references = [...JSON.stringify(description).matchAll(/"\$ref":"([^"]*)"/g)].map(([, to]) => to)
    expect(references.length).toBeGreaterThan(0)
    expect(new Set(references)).toEqual(new Set(['#/components/schemas/Problem']))
  })
})
