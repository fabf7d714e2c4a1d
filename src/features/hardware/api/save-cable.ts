import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import type { Cable } from '@shared/schemas/hardware'
import { call } from '@/lib/api-client'
import { hardwareQuery } from './read-hardware'

/** Adds a cable, or changes the one with this key. */
export const useSaveCable = (key: string | undefined) => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: Cable) =>
      key === undefined
        ? call(hardware.addCable, { body })
        : call(hardware.changeCable, { params: { key }, body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: hardwareQuery.queryKey }),
  })
}
