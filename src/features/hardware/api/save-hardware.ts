import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import type { Cable, Fitting } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import { call } from '@/lib/api-client'
import { hardwareQuery } from './read-hardware'
import { houseRulesQuery } from './read-house-rules'

const useRefresh = (queryKey: readonly unknown[]) => {
  const queries = useQueryClient()
  return () => queries.invalidateQueries({ queryKey })
}

/** Adds a fitting, or changes the one with this key. */
export const useSaveFitting = (key: string | undefined) =>
  useMutation({
    mutationFn: (body: Fitting) =>
      key === undefined
        ? call(hardware.addFitting, { body })
        : call(hardware.changeFitting, { params: { key }, body }),
    onSuccess: useRefresh(hardwareQuery.queryKey),
  })

/** Adds a cable, or changes the one with this key. */
export const useSaveCable = (key: string | undefined) =>
  useMutation({
    mutationFn: (body: Cable) =>
      key === undefined
        ? call(hardware.addCable, { body })
        : call(hardware.changeCable, { params: { key }, body }),
    onSuccess: useRefresh(hardwareQuery.queryKey),
  })

export interface Retirement {
  kind: 'fitting' | 'cable'
  key: string
  retired: boolean
}

/** Retires a fitting or cable, or offers it again. */
export const useRetire = () =>
  useMutation({
    mutationFn: async ({ kind, key, retired }: Retirement): Promise<void> => {
      const sent = { params: { key }, body: { retired } }
      await (kind === 'fitting' ? call(hardware.retireFitting, sent) : call(hardware.retireCable, sent))
    },
    onSuccess: useRefresh(hardwareQuery.queryKey),
  })

export const useSaveHouseRules = () =>
  useMutation({
    mutationFn: (body: HouseRules) => call(hardware.changeHouseRules, { body }),
    onSuccess: useRefresh(houseRulesQuery.queryKey),
  })
