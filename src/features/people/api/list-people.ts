import { queryOptions } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import { call } from '@/lib/api-client'

/** Everybody in the company. */
export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: async ({ signal }) => (await call(accounts.listPeople, { signal })).people,
})
