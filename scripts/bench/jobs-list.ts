import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import autocannon from 'autocannon'
import express, { type Express } from 'express'
import { accounts } from '../../shared/endpoints/accounts'
import { jobs as endpoints } from '../../shared/endpoints/jobs'
import { memoryPhotoStorage } from '../../server/adapters/fakes/memory-photo-storage'
import { createApp } from '../../server/app'
import { readConfig } from '../../server/config'
import { openDatabase, type OpenDatabase } from '../../server/database/client'
import { migrateDatabase } from '../../server/database/migrate'
import { jobPageQuery } from '../../server/features/jobs/jobs.queries'
import { createLog } from '../../server/log'
import { type Filled, fillWithJobs } from './jobs-list-data'

const JOBS = 100_000
const ROUNDS = 5
const SECONDS = 3
const CONNECTIONS = 20
const PAGE = 50

/**
 * The first page of 100 000 jobs, asked for by somebody signed in, through everything a request passes; `ratio` is its
 * throughput over that of a bare Express route which runs the same SQL on the same number of connections, both measured
 * in turn, five times each, their medians compared. The aim is 0.6.
 */
export async function benchJobsList() {
  const url = process.env['BENCH_DATABASE_URL']
  if (url === undefined) throw new Error('BENCH_DATABASE_URL is missing: give an empty database.')
  await migrateDatabase({ url, folder: 'drizzle' })
  const open = openDatabase({ url })
  try {
    const filled = await fillWithJobs(open, JOBS)
    const ours = await listen(realApp(url, open))
    const bare = await listen(bareApp(open, filled.companyId))
    try {
      const cookie = await signIn(ours, filled)
      await expectSamePage(ours, bare, cookie)
      return report(await measureInTurn(ours, bare, cookie))
    } finally {
      ours.server.close()
      bare.server.close()
    }
  } finally {
    await open.close()
  }
}

function realApp(url: string, open: OpenDatabase): Express {
  const secret = 'only for measuring on this machine'
  const config = readConfig({ NODE_ENV: 'production', DATABASE_URL: url, SESSION_SECRET: secret })
  const services = {
    config,
    open,
    database: open.database,
    photoStorage: memoryPhotoStorage(),
    // Lines are written in full and go nowhere.
    log: createLog({ logLevel: 'info' }, { write: () => undefined }),
    clock: () => new Date(),
  }
  return createApp(services, { requestsPerMinute: 1e9 })
}

function bareApp(open: OpenDatabase, companyId: string): Express {
  const form = { sort: 'updated', words: 0, stage: false, person: false, after: false } as const
  const { sql: text } = jobPageQuery(open.database, form)
  const app = express()
  app.disable('x-powered-by')
  app.get(endpoints.listJobs.path, async (_request, response) => {
    response.json(await open.sql.unsafe(text, [companyId, PAGE + 1], { prepare: true }))
  })
  return app
}

interface Listening {
  server: Server
  url: string
}

async function listen(app: Express): Promise<Listening> {
  const server = createServer(app)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  return { server, url: `http://127.0.0.1:${port}${endpoints.listJobs.path}` }
}

/** Signs in as people do; the answer is the cookie to send from then on. */
async function signIn({ url }: Listening, { email, password }: Filled): Promise<string> {
  const address = new URL(accounts.signIn.path, url)
  const before = await fetch(address)
  const { csrfToken } = (await before.json()) as { csrfToken: string }
  const answer = await fetch(address, {
    method: 'POST',
    headers: { cookie: cookieOf(before), 'x-csrf-token': csrfToken, 'content-type': 'application/json' },
    body: JSON.stringify({ email, password }),
  })
  if (answer.status !== 200) throw new Error(`Could not sign in: ${await answer.text()}`)
  return cookieOf(answer)
}

const cookieOf = (answer: Response): string => (answer.headers.get('set-cookie') ?? '').split(';')[0] ?? ''

/** Both must do the work: fifty jobs, and fifty-one rows. */
async function expectSamePage(ours: Listening, bare: Listening, cookie: string): Promise<void> {
  const answer = await fetch(ours.url, { headers: { cookie } })
  const page = (await answer.json()) as { jobs?: { number: number }[] }
  const rows = (await (await fetch(bare.url)).json()) as { number: number }[]
  const same = page.jobs?.every((job, i) => job.number === rows[i]?.number)
  if (page.jobs?.length !== PAGE || rows.length !== PAGE + 1 || !same) {
    throw new Error(`The two routes do not answer alike: ${answer.status}.`)
  }
}

async function measureInTurn(ours: Listening, bare: Listening, cookie: string) {
  const found = { ours: [] as number[], bare: [] as number[] }
  await load(ours.url, cookie, 1)
  await load(bare.url, cookie, 1)
  for (let round = 0; round < ROUNDS; round += 1) {
    found.ours.push(await load(ours.url, cookie, SECONDS))
    found.bare.push(await load(bare.url, cookie, SECONDS))
  }
  return found
}

/** Requests answered per second; the one who asks works in a thread of its own. */
async function load(url: string, cookie: string, duration: number): Promise<number> {
  const result = await autocannon({
    url,
    duration,
    connections: CONNECTIONS,
    workers: 1,
    headers: { cookie },
  })
  if (result.non2xx > 0 || result.errors > 0) {
    throw new Error(`${result.non2xx} refusals and ${result.errors} errors while measuring ${url}.`)
  }
  return result['2xx'] / result.duration
}

function report({ ours, bare }: { ours: number[]; bare: number[] }) {
  return {
    jobs: JOBS,
    connections: CONNECTIONS,
    requestsPerSecond: Math.round(median(ours)),
    reference: 'a bare Express route running the same SQL, on as many database connections',
    referenceRequestsPerSecond: Math.round(median(bare)),
    ratio: Math.round((median(ours) / median(bare)) * 100) / 100,
    aim: { ratio: 0.6 },
  }
}

const median = (values: number[]): number => values.sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0
