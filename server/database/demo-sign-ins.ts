import type { OpenDatabase } from './client'
import { demoSignIns } from './seed/demo-company'

/** How to sign in as the people of the demo company, a line each; none when the company is not in this database. */
export async function demoSignInLines({ sql }: OpenDatabase): Promise<string[]> {
  const emails = demoSignIns.map(({ email }) => email)
  const [found] = await sql<{ here: boolean }[]>`
    select exists (select from people where email = any(${emails})) as here`
  if (!found?.here) return []
  const width = Math.max(...emails.map((email) => email.length))
  return demoSignIns.map(
    ({ email, password, roles }) => `  ${email.padEnd(width)}  ${password}  (${roles.join(', ')})`,
  )
}
