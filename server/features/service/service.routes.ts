import type { Router } from 'express'
import { service } from '@shared/endpoints/service'
import { route } from '../../http/route'
import { cookieName } from '../../http/sessions'
import type { Services } from '../../services'
import { readHealth, readOpenapi } from './service.service'

export function serviceRoutes(router: Router, services: Services): void {
  const at = { router, services }
  let openapi: string | undefined
  route(at, service.health, ({ response }) => {
    response.set('Cache-Control', 'no-store')
    return readHealth(services.database)
  })
  route(at, service.openapi, ({ response }) => {
    openapi ??= readOpenapi(cookieName(services.config))
    response.type('application/json').send(openapi)
    return Promise.resolve(undefined)
  })
}
