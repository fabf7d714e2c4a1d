import { useMutation } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import { call } from '@/lib/api-client'

/** Makes a new one-time link; the older one stops working. */
export const useRenewInvitation = (personId: string) =>
  useMutation({
    mutationFn: () => call(accounts.renewInvitation, { params: { personId } }),
  })
