import path from 'node:path'
import express, { type Express, type RequestHandler, Router } from 'express'
import helmet from 'helmet'
import { protectFromForgery } from './http/csrf'
import { errorHandler, nothingHere } from './http/error-handler'
import { generalLimit } from './http/rate-limit'
import { requestLog } from './http/request-log'
import { sessions } from './http/sessions'
import type { Services } from './services'
import { featureRoutes } from './features/all.routes'

/** The whole server over its services: what every request passes, then the features, then the client's files. */
export function createApp(services: Services, { requestsPerMinute } = { requestsPerMinute: 1200 }): Express {
  const { config, log } = services
  const app = express()
  app.disable('x-powered-by')
  // The interface's answers are kept nowhere or for good, so none is ever asked for again; files have tags of their own.
  app.disable('etag')
  app.set('trust proxy', config.trustProxy ? 1 : false)
  app.use(requestLog(log))
  app.use(helmet(securityHeaders(config.secureCookies)))

  const api = Router()
  api.use(
    '/api',
    keepNowhere,
    generalLimit(requestsPerMinute),
    express.json({ limit: '2mb' }),
    ...sessions(services),
    protectFromForgery(config),
  )
  featureRoutes(api, services)
  api.use('/api', nothingHere)
  app.use(api)

  app.use(
    '/assets',
    express.static(path.join(config.clientFolder, 'assets'), {
      immutable: true,
      maxAge: '1y',
      fallthrough: false,
    }),
  )
  app.use(express.static(config.clientFolder, { index: false, maxAge: '1h' }))
  app.get(/^\/(?!api(\/|$))/, (_request, response) => {
    response.set('Cache-Control', 'no-cache')
    response.sendFile(path.join(config.clientFolder, 'index.html'))
  })
  app.use(errorHandler(log))
  return app
}

/** What the interface answers is one person's and may be out of date tomorrow; a route that knows better says so. */
const keepNowhere: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'private, no-store')
  next()
}

/** Everything comes from our own address; pictures may also be ones the page has just taken. */
const securityHeaders = (https: boolean) => ({
  contentSecurityPolicy: {
    directives: {
      defaultSrc: ["'self'"],
      imgSrc: ["'self'", 'blob:', 'data:'],
      // Konva and Radix place things by style attributes.
      styleSrc: ["'self'", "'unsafe-inline'"],
      fontSrc: ["'self'"],
      objectSrc: ["'none'"],
      frameAncestors: ["'none'"],
      upgradeInsecureRequests: https ? [] : null,
    },
  },
  strictTransportSecurity: https,
  referrerPolicy: { policy: 'same-origin' as const },
})
