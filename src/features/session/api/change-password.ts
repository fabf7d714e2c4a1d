import { useMutation } from '@tanstack/react-query'
import { accounts } from '@shared/endpoints/accounts'
import { call } from '@/lib/api-client'

/** Changes the own password; the server ends the person's other sessions. */
export const useChangePassword = () =>
  useMutation({
    mutationFn: (body: { current: string; next: string }) => call(accounts.changePassword, { body }),
  })
