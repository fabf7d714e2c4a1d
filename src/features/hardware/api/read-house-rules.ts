import { queryOptions } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import { call } from '@/lib/api-client'

export const houseRulesQuery = queryOptions({
  queryKey: ['house-rules'],
  queryFn: ({ signal }) => call(hardware.readHouseRules, { signal }),
  staleTime: 60_000,
})
