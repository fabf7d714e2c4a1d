import { AppError } from '../../errors'
import type { Database } from '../../database/client'
import { toSignedIn } from '../../http/account'
import { deleteSessionsOf } from '../../http/session-store.queries'
import type { SignedIn } from '../../http/signed-in'
import { hashNewPassword, passwordMatches } from './passwords'
import { selectAccount, selectByEmail, updateAccount } from './session.queries'

/** The person these belong to, or nobody; both answers take the same time. */
export async function checkPassword(
  database: Database,
  { email, password, now }: { email: string; password: string; now: Date },
): Promise<SignedIn | undefined> {
  const row = await selectByEmail(database, email)
  const matches = await passwordMatches(password, row?.person.passwordHash)
  if (!row || !matches || row.person.disabledAt) return undefined
  await updateAccount(database, row.person, { lastSignInAt: now })
  return toSignedIn(row.person, row.company)
}

/** Gives a person a new password and ends their other sessions. */
export async function changePassword(
  database: Database,
  {
    person,
    current,
    next,
    keepSession,
  }: { person: SignedIn; current: string; next: string; keepSession: string },
): Promise<void> {
  const row = await selectAccount(database, person)
  if (!(await passwordMatches(current, row?.person.passwordHash))) {
    const message = 'This is not your present password.'
    throw new AppError(400, 'wrong-password', message, { fields: [{ path: 'current', message }] })
  }
  const passwordHash = await hashNewPassword(next, 'next')
  await database.transaction(async (transaction) => {
    await updateAccount(transaction, person, { passwordHash })
    await deleteSessionsOf(transaction, person.id, keepSession)
  })
}
