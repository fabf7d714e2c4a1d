import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import { call } from '@/lib/api-client'
import { houseRulesQuery } from './read-house-rules'

export const useSaveHouseRules = () => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: HouseRules) => call(hardware.changeHouseRules, { body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: houseRulesQuery.queryKey }),
  })
}
