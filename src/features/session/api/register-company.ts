import type { Units } from '@shared/schemas/quantities'
import { call } from '@/lib/api-client'
import { signInAddresses } from '../sign-in-addresses'

/** Registers a company; its first person is its owner and is signed in. */
export const registerCompany =
  (length: Units['length']) =>
  ({ company = '', name = '', email = '', password = '' }: Record<string, string>) =>
    call(signInAddresses.registerCompany, {
      body: { company, name, email, password, units: { length, force: length === 'in' ? 'lbf' : 'N' } },
    })
