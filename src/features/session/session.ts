import { queryOptions } from '@tanstack/react-query'
import { createContext, use } from 'react'
import { signInAddresses } from './sign-in-addresses'
import type { Ability } from '@shared/permissions/abilities'
import { can } from '@shared/permissions/abilities'
import type { Session } from '@shared/schemas/session'
import { call, keepToken } from '@/lib/api-client'

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Session | null> => {
    const { session, csrfToken } = await call(signInAddresses.readSession, { signal })
    keepToken(csrfToken)
    return session
  },
  staleTime: 60_000,
})

/**
 * The session as the layout of the signed-in pages found it. Handed down rather than read from the kept answers: those
 * can be emptied at any moment, and a page still on the screen would be left without anybody.
 */
export const SessionContext = createContext<Session | null>(null)

/** Who is signed in, below the layout of the signed-in pages, where somebody always is. @throws when asked elsewhere. */
export function useSession(): Session {
  const session = use(SessionContext)
  if (!session) throw new Error('This part of the program is for people who are signed in.')
  return session
}

/** Whether the person signed in may do this; the server asks again. */
export function useMay(ability: Ability): boolean {
  const { person, company } = useSession()
  const subject = { companyId: company.id }
  return can({ companyId: company.id, roles: person.roles }, ability, subject)
}
