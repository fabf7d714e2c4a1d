import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import { call } from '@/lib/api-client'
import { guardRulesQuery } from './list-guard-rules'

/** Retires own guard rules, or offers them again. */
export const useRetireGuardRules = () => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: ({ key, retired }: { key: string; retired: boolean }) =>
      call(hardware.retireGuardRules, { params: { key }, body: { retired } }),
    onSuccess: () => queries.invalidateQueries({ queryKey: guardRulesQuery.queryKey }),
  })
}
