import { QueryClient } from '@tanstack/react-query'
import { ApiError } from './api-error'

/** The server's answers, kept for a short while. Nothing that people have entered lives here. */
export const queryClient = new QueryClient({
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
