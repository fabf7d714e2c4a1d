import { expect, it } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { signInAddresses } from '../../../../src/features/session/sign-in-addresses'

it('calls the sign-in path as the endpoints describe it', () => {
  for (const [name, { method, path }] of Object.entries(signInAddresses)) {
    const described = accounts[name as keyof typeof signInAddresses]
    expect({ name, method, path }).toEqual({ name, method: described.method, path: described.path })
  }
})
