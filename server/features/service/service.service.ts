import { allEndpoints } from '@shared/endpoints/all'
import type { Database } from '../../database/client'
import { AppError } from '../../errors'
import { describeEndpoints } from './openapi'
import { askDatabase } from './service.queries'

/** A watcher that waits longer than this for the database gives up on us. */
const PATIENCE_MS = 3_000

/** Whether server and database answer. @throws AppError 503 when the database does not, in time. */
export async function readHealth(database: Database): Promise<{ status: 'ok'; database: 'ok' }> {
  let timer: NodeJS.Timeout | undefined
  const impatience = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => reject(new Error(`no answer in ${PATIENCE_MS} ms`)), PATIENCE_MS)
  })
  try {
    await Promise.race([askDatabase(database), impatience])
    return { status: 'ok', database: 'ok' }
  } catch (error) {
    throw new AppError(503, 'database-away', 'The database does not answer. Try again in a minute.', {
      cause: error,
    })
  } finally {
    clearTimeout(timer)
  }
}

/** The description of everything the server answers, as text: it never changes while the server runs. */
export const readOpenapi = (cookieName: string): string =>
  JSON.stringify(describeEndpoints(allEndpoints, cookieName))
