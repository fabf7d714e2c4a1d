import type { Role } from './roles'

const everyone: readonly Role[] = ['owner', 'surveyor', 'estimator', 'shop', 'fitter']
const owner: readonly Role[] = ['owner']
const office: readonly Role[] = ['owner', 'estimator']
const field: readonly Role[] = ['owner', 'estimator', 'surveyor']

/** Which roles may do what, inside their own company. The server asks; the screens only follow. */
const allowed = {
  'company:read': everyone,
  'company:edit': owner,
  'people:read': everyone,
  'people:manage': owner,
  'job:read': everyone,
  'job:create': field,
  'job:edit': field,
  'job:move': office,
  'survey:read': everyone,
  'survey:edit': field,
  'survey:remove': office,
  /** Let a *stop* pass, with a reason. */
  'finding:overrule': office,
  'guard-rules:read': everyone,
  'guard-rules:edit': owner,
  'cut-list:read': everyone,
  'hardware:read': everyone,
  'hardware:edit': owner,
  'house-rules:read': everyone,
  'house-rules:edit': owner,
} as const satisfies Record<string, readonly Role[]>

export type Ability = keyof typeof allowed
export const abilities = Object.keys(allowed) as Ability[]

interface Person {
  companyId: string
  roles: readonly Role[]
}

/** Whether a person may do this to something of a company: same company first, then the role. */
export function can(person: Person, ability: Ability, subject: { companyId: string }): boolean {
  if (person.companyId !== subject.companyId) return false
  return holds(person.roles, ability)
}

/** Whether any of these roles carries the ability, the company aside. */
export function holds(held: readonly Role[], ability: Ability): boolean {
  const roles: readonly Role[] = allowed[ability]
  return held.some((role) => roles.includes(role))
}
