import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import { accounts } from '@shared/endpoints/accounts'
import { call } from '@/lib/api-client'

/** Ends the session, leaves for the sign-in page and forgets everything that was fetched. */
export function useSignOut() {
  const queries = useQueryClient()
  const navigate = useNavigate()
  return useMutation({
    mutationFn: () => call(accounts.signOut),
    onSuccess: async () => {
      await navigate('/sign-in')
      queries.clear()
    },
  })
}
