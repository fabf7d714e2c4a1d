import { useMutation, useQueryClient } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import type { Role } from '@shared/schemas/role'
import { call } from '@/lib/api-client'
import { peopleQuery } from './list-people'

/** Adds a person; answers with their one-time link. */
export function useAddPerson() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: { name: string; email: string; roles: Role[] }) =>
      call(accounts.invitePerson, { body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  })
}
