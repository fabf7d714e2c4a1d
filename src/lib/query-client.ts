import { QueryCache, QueryClient } from '@tanstack/react-query'
import { ApiError } from './api-error'

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
      // What the server has refused it will refuse again.
      retry: (failures, error) => !(error instanceof ApiError && error.status > 0) && failures < 2,
      retryDelay: 800,
    },
    mutations: { retry: false },
  },
})
