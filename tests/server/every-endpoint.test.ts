import type { Express } from 'express'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { allEndpoints } from '@shared/endpoints/all'
import { openTestDatabase, type TestDatabase } from '../setup/database'
import { type EndpointCase, testEndpoint } from '../support/endpoint-cases'
import { createScene } from '../support/scene'
import { createTestApp, type TestApp } from '../support/test-app'

/** Every feature declares the cases of its endpoints in `features/X/X.endpoints.ts`. */
const declared = Object.values(
  import.meta.glob<{ cases: EndpointCase[] }>('./features/**/*.endpoints.ts', { eager: true }),
).flatMap(({ cases }) => cases)

let database: TestDatabase
let test: TestApp

beforeAll(async () => {
  database = await openTestDatabase()
  test = createTestApp({ open: database })
})
afterAll(() => database.close())

const name = ({ method, path }: { method: string; path: string }) => `${method} ${path}`

describe('the endpoints', () => {
  it('are all served, and nothing else is', () => {
    expect(served(test.app).sort()).toEqual(allEndpoints.map(name).sort())
  })

  it('all have their cases, once', () => {
    expect(declared.map(({ endpoint }) => endpoint.id).sort()).toEqual(
      allEndpoints.map(({ id }) => id).sort(),
    )
  })

  it('have each an id of their own', () => {
    expect(new Set(allEndpoints.map(({ id }) => id)).size).toBe(allEndpoints.length)
  })
})

for (const each of declared) testEndpoint(each, () => createScene(test))

interface Layer {
  route?: { path: unknown; methods: Record<string, boolean> }
  handle?: { stack?: Layer[] }
}

/** What Express really answers below `/api`, read from its routers. */
function served(app: Express): string[] {
  const layers = (stack: Layer[]): string[] =>
    stack.flatMap(({ route, handle }) =>
      route
        ? Object.keys(route.methods).map((method) =>
            name({ method: method.toUpperCase(), path: String(route.path) }),
          )
        : layers(handle?.stack ?? []),
    )
  // Beside the endpoints only the client’s pages are served, by a pattern that leaves `/api` out.
  return layers((app.router as unknown as { stack: Layer[] }).stack).filter((each) => each.includes(' /api'))
}
