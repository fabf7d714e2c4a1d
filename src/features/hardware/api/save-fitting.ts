import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import type { Fitting } from '@shared/schemas/hardware'
import { call } from '@/lib/api-client'
import { hardwareQuery } from './read-hardware'

/** Adds a fitting, or changes the one with this key. */
export const useSaveFitting = (key: string | undefined) => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: Fitting) =>
      key === undefined
        ? call(hardware.addFitting, { body })
        : call(hardware.changeFitting, { params: { key }, body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: hardwareQuery.queryKey }),
  })
}
