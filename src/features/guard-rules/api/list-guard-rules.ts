import { queryOptions } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import { call } from '@/lib/api-client'

/** The company's own guard rules, retired ones too. */
export const guardRulesQuery = queryOptions({
  queryKey: ['guard-rules'],
  queryFn: ({ signal }) => call(hardware.listGuardRules, { signal }),
  staleTime: 60_000,
})
