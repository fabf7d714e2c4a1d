import { useMutation, useQueryClient } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import type { Role } from '@shared/schemas/role'
import { call } from '@/lib/api-client'
import { peopleQuery } from './list-people'

const useRefreshPeople = () => {
  const queries = useQueryClient()
  return () => queries.invalidateQueries({ queryKey: peopleQuery.queryKey })
}

/** Adds a person; answers with their one-time link. */
export const useInvite = () =>
  useMutation({
    mutationFn: (body: { name: string; email: string; roles: Role[] }) =>
      call(accounts.invitePerson, { body }),
    onSuccess: useRefreshPeople(),
  })

export interface PersonChange {
  personId: string
  body: { roles?: Role[]; disabled?: boolean }
}

/** Changes roles, disables or enables. */
export const useChangePerson = () =>
  useMutation({
    mutationFn: ({ personId, body }: PersonChange) =>
      call(accounts.changePerson, { params: { personId }, body }),
    onSuccess: useRefreshPeople(),
  })

/** Makes a new one-time link; the older one stops working. */
export const useRenewInvitation = () =>
  useMutation({
    mutationFn: (personId: string) => call(accounts.renewInvitation, { params: { personId } }),
    onSuccess: useRefreshPeople(),
  })
