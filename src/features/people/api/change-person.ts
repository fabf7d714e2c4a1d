import { useMutation, useQueryClient } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import type { Role } from '@shared/schemas/role'
import { call } from '@/lib/api-client'

/** Changes a person's roles, disables or enables them. */
export function useChangePerson(personId: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: { roles?: Role[]; disabled?: boolean }) =>
      call(accounts.changePerson, { params: { personId }, body }),
    // The session too: owners can change their own roles.
    onSuccess: () =>
      Promise.all([
        queries.invalidateQueries({ queryKey: ['people'] }),
        queries.invalidateQueries({ queryKey: ['session'] }),
      ]),
  })
}
