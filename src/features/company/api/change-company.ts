import { useMutation, useQueryClient } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import type { Company } from '@shared/schemas/company'
import { call } from '@/lib/api-client'

/** Changes the company; the session, which carries it, is read again. */
export function useChangeCompany() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: Partial<Omit<Company, 'id'>>) => call(accounts.changeCompany, { body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['session'] }),
  })
}
