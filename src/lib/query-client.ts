import { QueryCache, QueryClient } from '@tanstack/react-query'
import { ApiError } from './api-error'

/** What the server has refused it will refuse again; silence and a stumble are worth two more tries. */
export const mayRetry = (failures: number, error: unknown): boolean =>
  failures < 2 && !(error instanceof ApiError && error.status > 0 && error.status < 500)

/** The server's answers, kept for a short while. Nothing that people have entered lives here. */
export const queryClient = new QueryClient({
  queryCache: new QueryCache({
    onError: (error) => {
      // The session has ended, here or on the server: ask again who is signed in, and the frame leads to sign-in.
      if (error instanceof ApiError && error.status === 401) {
        void queryClient.invalidateQueries({ queryKey: ['session'] })
      }
    },
  }),
  defaultOptions: {
    queries: {
      staleTime: 15_000,
      // Without a connection a request fails and says so; it does not wait in silence for one.
      networkMode: 'always',
      refetchOnReconnect: true,
      retry: mayRetry,
      retryDelay: 800,
    },
    mutations: { retry: false, networkMode: 'always' },
  },
})
