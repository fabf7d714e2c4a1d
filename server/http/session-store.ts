import { createHash } from 'node:crypto'
import type { Request } from 'express'
import { type Session, type SessionData, Store } from 'express-session'
import type { Database } from '../database/client'
import { toSignedIn } from './account'
import {
  deleteExpiredSessions,
  deleteSession,
  sessionFinder,
  updateSession,
  upsertSession,
} from './session-store.queries'
import type { SignedIn } from './signed-in'

export const SESSION_DAYS = 30
const HOUR = 3_600_000
/** Without use; before sign-in a session only holds a token. */
const lifetime = (signedIn: boolean): number => (signedIn ? SESSION_DAYS * 24 * HOUR : 2 * HOUR)

export const hashSessionId = (id: string): string => createHash('sha256').update(id).digest('hex')

type Done = (error?: unknown) => void
/** What `get` hands to `createSession` beside the data, out of the way of whoever writes or compares these. */
type FoundSession = SessionData & { account?: SignedIn }

/**
 * Sessions in PostgreSQL. One query reads the session, its person and their company, so a request costs one look-up
 * and a person who was disabled or changed is seen as they are now.
 */
export class SessionStore extends Store {
  private readonly find: ReturnType<typeof sessionFinder>
  /** When sessions that have ended were last cleared away. */
  private sweptAt = 0

  constructor(
    private readonly database: Database,
    private readonly clock: () => Date,
  ) {
    super()
    this.find = sessionFinder(database)
  }

  override get(id: string, done: (error: unknown, session?: SessionData | null) => void): void {
    this.read(id).then((session) => done(null, session), done)
  }

  override set(id: string, session: SessionData, done?: Done): void {
    this.sweepNowAndThen()
    const { person } = session
    const row = {
      idHash: hashSessionId(id),
      companyId: person?.companyId ?? null,
      personId: person?.id ?? null,
      data: session,
      expiresAt: new Date(this.clock().getTime() + lifetime(person !== undefined)),
    }
    answer((session.known ? updateSession : upsertSession)(this.database, row), done)
  }

  /** Makes the session of a request, and its person. */
  override createSession(request: Request, found: FoundSession): Session & SessionData {
    const session = super.createSession(request, found)
    hide(session, 'known', true)
    request.user = found.account
    return session
  }

  override destroy(id: string, done?: Done): void {
    answer(deleteSession(this.database, hashSessionId(id)), done)
  }

  private async read(id: string): Promise<SessionData | null> {
    const row = await this.find(hashSessionId(id), this.clock())
    if (!row) return null
    // A session that was somebody's and is nobody's now belongs to a disabled person.
    if (row.personId !== null && !row.person) return null
    const found = row.data as SessionData
    if (row.person && row.company) hide(found, 'account', toSignedIn(row.person, row.company))
    return found
  }

  private sweepNowAndThen(): void {
    const now = this.clock()
    if (now.getTime() - this.sweptAt < HOUR) return
    this.sweptAt = now.getTime()
    // What fails now is done an hour later; nobody waits for it.
    deleteExpiredSessions(this.database, now).catch(() => undefined)
  }
}

/** A property that is not written with the rest, nor compared. */
function hide(object: object, name: string, value: unknown): void {
  Object.defineProperty(object, name, { value, enumerable: false })
}

function answer(work: Promise<void>, done: Done | undefined): void {
  work.then(
    () => done?.(),
    (error: unknown) => done?.(error),
  )
}
