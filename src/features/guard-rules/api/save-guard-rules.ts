import { useMutation, useQueryClient } from '@tanstack/react-query'
import { hardware } from '@shared/endpoints/hardware'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { call } from '@/lib/api-client'
import { guardRulesQuery } from './list-guard-rules'

/** Adds own guard rules, or changes those with this key. */
export const useSaveGuardRules = (key: string | undefined) => {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: GuardRules) =>
      key === undefined
        ? call(hardware.addGuardRules, { body })
        : call(hardware.changeGuardRules, { params: { key }, body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: guardRulesQuery.queryKey }),
  })
}
