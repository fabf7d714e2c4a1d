import { z } from 'zod'
import { endpoint } from './endpoint'

export const service = {
  health: endpoint({
    id: 'service.health',
    method: 'GET',
    path: '/api/health',
    gate: 'public',
    summary: 'Whether the server and its database answer.',
    response: z.object({ status: z.literal('ok'), database: z.literal('ok') }),
  }),
  openapi: endpoint({
    id: 'service.openapi',
    method: 'GET',
    path: '/api/openapi.json',
    gate: 'public',
    summary: 'This description.',
    file: 'application/json',
  }),
}
