import { call } from '@/lib/api-client'
import { signInAddresses } from '../sign-in-addresses'

/** Uses a one-time link: sets the password and signs in. */
export const acceptInvitation =
  (token: string) =>
  ({ password = '' }: Record<string, string>) =>
    call(signInAddresses.acceptInvitation, { params: { token }, body: { password } })
