import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { FormEvent } from 'react'
import { useNavigate, useSearchParams } from 'react-router-dom'
import type { Session } from '@shared/schemas/session'
import { useFirstFault } from '@/components/use-first-fault'
import { keepToken } from '@/lib/api-client'
import { safeNext } from './safe-next'
import { sessionQuery } from './session'

/** A form that ends in a session: sends its fields, keeps the session, goes on. */
export function useEntry(send: (fields: Record<string, string>) => Promise<Session>) {
  const queries = useQueryClient()
  const navigate = useNavigate()
  const [search] = useSearchParams()
  const entry = useMutation({
    mutationFn: send,
    onSuccess: async (session) => {
      keepToken(session.csrfToken)
      queries.clear()
      queries.setQueryData(sessionQuery.queryKey, session)
      await navigate(safeNext(search.get('next')), { replace: true })
    },
  })
  const form = useFirstFault(entry.error)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const fields = Object.fromEntries(new FormData(event.currentTarget)) as Record<string, string>
    entry.mutate(fields)
  }
  return { form, submit, error: entry.error, busy: entry.isPending }
}
