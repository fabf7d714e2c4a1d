import { queryOptions } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import { call } from '@/lib/api-client'

/** The company's whole catalogue, retired entries too. */
export const hardwareQuery = queryOptions({
  queryKey: ['hardware'],
  queryFn: ({ signal }) => call(hardware.listHardware, { signal }),
  staleTime: 60_000,
})
