import { queryOptions, useQuery } from '@tanstack/react-query'
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

/** Who is signed in, behind `RequireSession`, where somebody always is. @throws when asked elsewhere. */
export function useSession(): Session {
  const { data } = useQuery(sessionQuery)
  if (!data) throw new Error('This part of the program is for people who are signed in.')
  return data
}

/** Whether the person signed in may do this; the server asks again. */
export function useMay(ability: Ability): boolean {
  const { person, company } = useSession()
  const subject = { companyId: company.id }
  return can({ companyId: company.id, roles: person.roles }, ability, subject)
}
