import { call } from '@/lib/api-client'
import { signInAddresses } from '../sign-in-addresses'

/** Signs in; answers with the new session. */
export const signIn = ({ email = '', password = '' }: Record<string, string>) =>
  call(signInAddresses.signIn, { body: { email, password } })
