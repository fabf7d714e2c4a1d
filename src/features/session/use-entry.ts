import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { FormEvent } from 'react'
import { useNavigate, useSearchParams } from 'react-router-dom'
import type { Session } from '@shared/schemas/session'
import { keepToken } from '@/lib/api-client'
import { sessionQuery } from './session'

/** Where to go after signing in: what was asked for, so far as it is a page of ours. */
export const safeNext = (next: string | null): string => (next && /^\/(?![/\\])/.test(next) ? next : '/jobs')

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
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const fields = Object.fromEntries(new FormData(event.currentTarget)) as Record<string, string>
    entry.mutate(fields)
  }
  return { submit, error: entry.error, busy: entry.isPending }
}
