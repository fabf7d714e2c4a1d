import { createHash, randomBytes } from 'node:crypto'
import type { Database } from '../../database/client'
import { toSignedIn } from '../../http/account'
import { deleteSessionsOf } from '../../http/session-store.queries'
import type { SignedIn } from '../../http/signed-in'
import { hashNewPassword } from '../session/passwords'
import { linkUsedUp } from './people.errors'
import {
  deleteInvitation,
  type PersonKey,
  replaceInvitation,
  selectInvitation,
  updatePerson,
} from './people.queries'

const DAYS = 7
const hash = (token: string): string => createHash('sha256').update(token).digest('hex')

/** Makes the one-time link of a person; the older one stops working. */
export async function makeInvitation(
  database: Database,
  key: PersonKey,
  { now, address }: { now: Date; address: string },
): Promise<{ link: string; expires: string }> {
  const token = randomBytes(32).toString('base64url')
  const expiresAt = new Date(now.getTime() + DAYS * 86_400_000)
  await replaceInvitation(database, key, { tokenHash: hash(token), expiresAt })
  return { link: `${address}/invite/${token}`, expires: expiresAt.toISOString() }
}

/** Whom a link is for. */
export async function readInvitation(database: Database, { token, now }: { token: string; now: Date }) {
  const row = await selectInvitation(database, hash(token), now)
  if (!row || row.person.disabledAt) throw linkUsedUp()
  return { company: row.company.name, name: row.person.name, email: row.person.email }
}

/** Uses a link: sets the password, ends any older sessions, and says who is to be signed in. */
export async function acceptInvitation(
  database: Database,
  { token, password, now }: { token: string; password: string; now: Date },
): Promise<SignedIn> {
  const passwordHash = await hashNewPassword(password, 'password')
  return database.transaction(async (transaction) => {
    const row = await selectInvitation(transaction, hash(token), now)
    if (!row || row.person.disabledAt || !(await deleteInvitation(transaction, hash(token))))
      throw linkUsedUp()
    await deleteSessionsOf(transaction, row.person.id)
    const person = await updatePerson(transaction, row.person, { passwordHash, lastSignInAt: now })
    if (!person) throw linkUsedUp()
    return toSignedIn(person, row.company)
  })
}
