import { createHash } from 'node:crypto'
import { type SessionData, Store } from 'express-session'
import type { Database } from '../database/client'
import {
  deleteExpiredSessions,
  deleteSession,
  extendSession,
  selectSession,
  upsertSession,
} from './session-store.queries'
import { toSignedIn } from './account'
import './signed-in'

export const SESSION_DAYS = 30
const HOUR = 3_600_000
const lifetime = (signedIn: boolean): number => (signedIn ? SESSION_DAYS * 24 * HOUR : 2 * HOUR)

export const hashSessionId = (id: string): string => createHash('sha256').update(id).digest('hex')

type Done<Value = void> = (error?: unknown, value?: Value) => void
type Passported = SessionData & { passport?: { user?: { id: string; companyId: string } } }

/**
 * Sessions in PostgreSQL. One query reads the session, its person and their company, so a request costs one look-up
 * and a person who was disabled or changed is seen as they are now.
 */
export class SessionStore extends Store {
  constructor(
    private readonly database: Database,
    private readonly clock: () => Date,
  ) {
    super()
  }

  override get(id: string, done: (error: unknown, session?: SessionData | null) => void): void {
    this.read(id).then((session) => done(null, session), done)
  }

  /** When sessions that have ended were last cleared away. */
  private sweptAt = 0

  override set(id: string, session: SessionData, done?: Done): void {
    this.sweepNowAndThen()
    const { account: _account, ...data } = session as Passported
    const user = data.passport?.user
    upsertSession(this.database, {
      idHash: hashSessionId(id),
      companyId: user?.companyId ?? null,
      personId: user?.id ?? null,
      data,
      expiresAt: this.expiry(user !== undefined),
    }).then(
      () => done?.(),
      (error: unknown) => done?.(error),
    )
  }

  override destroy(id: string, done?: Done): void {
    deleteSession(this.database, hashSessionId(id)).then(
      () => done?.(),
      (error: unknown) => done?.(error),
    )
  }

  /** Called with every answer; the row is written at most once an hour. */
  override touch(id: string, session: SessionData, done?: () => void): void {
    const signedIn = session.account !== undefined
    const left = (session.expiresAt ?? 0) - this.clock().getTime()
    if (left > lifetime(signedIn) - HOUR) return done?.()
    extendSession(this.database, hashSessionId(id), this.expiry(signedIn)).then(
      () => done?.(),
      () => done?.(),
    )
  }

  private async read(id: string): Promise<SessionData | null> {
    const row = await selectSession(this.database, hashSessionId(id))
    if (!row || row.session.expiresAt <= this.clock()) return null
    // A session that was somebody's and is nobody's now belongs to a disabled person.
    if (row.session.personId && !row.person) return null
    const session = row.session.data as SessionData
    session.expiresAt = row.session.expiresAt.getTime()
    if (row.person && row.company) session.account = toSignedIn(row.person, row.company)
    return session
  }

  private sweepNowAndThen(): void {
    const now = this.clock()
    if (now.getTime() - this.sweptAt < HOUR) return
    this.sweptAt = now.getTime()
    // What fails now is done an hour later; nobody waits for it.
    deleteExpiredSessions(this.database, now).catch(() => undefined)
  }

  private expiry(signedIn: boolean): Date {
    return new Date(this.clock().getTime() + lifetime(signedIn))
  }
}
