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
      // The page is left before what it shows is taken away.
      await navigate('/sign-in', { flushSync: true })
      queries.clear()
    },
  })
}
