import type { Response } from 'supertest'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Endpoint } from '@shared/endpoints/endpoint'
import { type Role, roles } from '@shared/schemas/role'
import { holds } from '@shared/permissions/abilities'
import { type Client, type Sent, visitor } from './client'
import type { Scene } from './scene'

/** What a check is told: the answer, what was sent, by whom. */
export interface Told {
  answer: Response
  sent: Sent
  client: Client
  scene: Scene
}

/**
 * How one endpoint is tested for nobody, a wrong role, another company and for working. Who may is read from the
 * endpoint's gate, so a case only says what is sent and what must come of it.
 */
export interface EndpointCase {
  endpoint: Endpoint
  /** What somebody of `scene.here` sends; makes what it needs first. Asked again for every request of a test. */
  request?: (scene: Scene) => Sent | Promise<Sent>
  /** Beyond the status and the shape of the answer, which are always checked. */
  works: (told: Told) => void | Promise<void>
  /**
   * What an owner of another company gets for the very same request: `not found`, or a check of their answer where
   * the request names nothing of a company (a list must lack the other's things), or why there is nothing to check.
   */
  otherCompany: 'not found' | ((told: Told) => void | Promise<void>) | { because: string }
}

/** Registers the tests of a case. `stage` gives a scene of its own to each test. */
export function testEndpoint(each: EndpointCase, stage: () => Promise<Scene>): void {
  const { endpoint } = each
  describe(`${endpoint.id} ${endpoint.method} ${endpoint.path}`, () => {
    let scene: Scene
    beforeEach(async () => {
      scene = await stage()
    })
    const sentBy = async (client: Client): Promise<Told> => {
      const sent = (await each.request?.(scene)) ?? {}
      return { answer: await client.send(endpoint, sent), sent, client, scene }
    }
    testNobody(each, sentBy, () => scene)
    testRoles(each, sentBy, () => scene)
    testOtherCompany(each, sentBy, () => scene)
    if (endpoint.method !== 'GET') testForgery(each, () => scene)
  })
}

type Send = (client: Client) => Promise<Told>
type Stage = () => Scene

function testNobody(each: EndpointCase, sentBy: Send, scene: Stage): void {
  if (each.endpoint.gate === 'public') {
    it('not signed in: works, since it is public', async () => {
      await expectWorks(each, await sentBy(visitor(scene().test.app)))
    })
    return
  }
  it('not signed in: refused', async () => {
    const { answer } = await sentBy(visitor(scene().test.app))
    expectRefusal(answer, 401, 'not-signed-in')
  })
}

function testRoles(each: EndpointCase, sentBy: Send, scene: Stage): void {
  const { gate } = each.endpoint
  if (gate === 'public') return
  const mayNot = roles.filter((role) => gate !== 'signed-in' && !holds([role], gate))
  for (const role of mayNot) {
    it(`wrong role: refused to ${role}`, async () => {
      const { answer } = await sentBy(await scene().here.as(role))
      expectRefusal(answer, 403, 'not-allowed')
    })
  }
  for (const role of roles.filter((role) => !mayNot.includes(role))) {
    it(`works for ${role}${mayNot.length === 0 ? ', no role being wrong' : ''}`, async () => {
      await expectWorks(each, await sentBy(await scene().here.as(role)))
    })
  }
}

function testOtherCompany(each: EndpointCase, sentBy: Send, scene: Stage): void {
  const { otherCompany, endpoint } = each
  if (otherCompany === 'not found') {
    it('another company: not found, and nothing has changed', async () => {
      const { answer, sent } = await sentBy(await scene().elsewhere.as('owner'))
      expectRefusal(answer, 404, 'not-found')
      const client = await scene().here.as('owner')
      await expectWorks(each, {
        answer: await client.send(endpoint, sent),
        sent,
        client,
        scene: scene(),
      })
    })
  } else if (typeof otherCompany === 'function') {
    it('another company: sees and changes only its own', async () => {
      await otherCompany(await sentBy(await scene().elsewhere.as('owner')))
    })
  } else {
    it(`another company: no matter, because ${otherCompany.because}`, () => {
      // Only what names nothing of a company may say so.
      expect(endpoint.path).not.toMatch(/:(?!token\b)\w+/)
    })
  }
}

function testForgery(each: EndpointCase, scene: Stage): void {
  const may = roles.find((role) => mayCall(each.endpoint, role)) ?? 'owner'
  it('without the token of its session: refused', async () => {
    const sent = (await each.request?.(scene())) ?? {}
    const client = each.endpoint.gate === 'public' ? visitor(scene().test.app) : await scene().here.as(may)
    expectRefusal(await client.send(each.endpoint, { ...sent, csrf: null }), 403, 'stale-page')
  })
}

const mayCall = ({ gate }: Endpoint, role: Role): boolean =>
  gate === 'public' || gate === 'signed-in' || holds([role], gate)

async function expectWorks({ endpoint, works }: EndpointCase, told: Told): Promise<void> {
  const { answer } = told
  const expected = endpoint.status ?? (endpoint.response || endpoint.file ? 200 : 204)
  expect(answer.status, answer.text).toBe(expected)
  if (endpoint.file !== undefined) {
    expect(answer.headers['content-type']).toMatch(new RegExp(`^${endpoint.file.replace(/[.+]/g, '\\$&')}`))
  } else if (endpoint.response) {
    // Equal to itself as read by the schema: all that is promised is there and nothing else gets out.
    expect(endpoint.response.parse(answer.body)).toEqual(answer.body)
  }
  await works(told)
}

/** That an answer is this refusal, as problem+json with a sentence. */
export function expectRefusal(answer: Response, status: number, code: string): void {
  expect({ status: answer.status, code: (answer.body as { code?: unknown }).code }, answer.text).toEqual({
    status,
    code,
  })
  expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/)
  expect((answer.body as { detail: string }).detail).toMatch(/\.$/)
}
