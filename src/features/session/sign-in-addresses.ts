import type { accounts } from '@shared/endpoints/accounts'

/**
 * The calls of the sign-in path with their method and path written out, so that these first pages do not carry the
 * descriptions' schemas. A test compares them with `shared/endpoints/accounts`.
 */
type Slim<Name extends keyof typeof accounts> = (typeof accounts)[Name]

const slim = <Name extends keyof typeof accounts>(
  method: Slim<Name>['method'],
  path: Slim<Name>['path'],
): Slim<Name> => ({ method, path }) as Slim<Name>

export const signInAddresses = {
  readSession: slim<'readSession'>('GET', '/api/session'),
  signIn: slim<'signIn'>('POST', '/api/session'),
  registerCompany: slim<'registerCompany'>('POST', '/api/companies'),
  readInvitation: slim<'readInvitation'>('GET', '/api/invitations/:token'),
  acceptInvitation: slim<'acceptInvitation'>('POST', '/api/invitations/:token'),
}
