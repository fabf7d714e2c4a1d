import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import { call } from '@/lib/api-client'
import { hardwareQuery } from './read-hardware'

export interface Retirement {
  kind: 'fitting' | 'cable'
  key: string
  retired: boolean
}

/** Retires a fitting or cable, or offers it again. */
export const useRetire = () => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: async ({ kind, key, retired }: Retirement): Promise<void> => {
      const sent = { params: { key }, body: { retired } }
      await (kind === 'fitting' ? call(hardware.retireFitting, sent) : call(hardware.retireCable, sent))
    },
    onSuccess: () => queries.invalidateQueries({ queryKey: hardwareQuery.queryKey }),
  })
}
