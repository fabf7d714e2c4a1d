import { queryOptions } from '@tanstack/react-query'
import { call } from '@/lib/api-client'
import { signInAddresses } from '../sign-in-addresses'

/** Whom a one-time link is for. */
export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => call(signInAddresses.readInvitation, { params: { token }, signal }),
    staleTime: Infinity,
  })
