import type { Page } from '@playwright/test'
import { demoSignIns } from '../../server/database/seed/demo-company'
import { roles, type Role } from '../../shared/schemas/role'
import { expect } from './test'

export interface SignIn {
  email: string
  password: string
}

/** How the demo company's person with a role signs in; the one with the fewest other roles. */
export function demoSignIn(role: Role): SignIn {
  const [person] = demoSignIns
    .filter((each) => each.roles.includes(role))
    .sort((a, b) => a.roles.length - b.roles.length)
  if (!person) throw new Error(`Nobody in the demo company is ${role}; roles are ${roles.join(', ')}.`)
  return person
}

/** Signs in as a hand would, and waits until the sign-in page is left. */
export async function signInByHand(page: Page, { email, password }: SignIn): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel(/e-mail/i).fill(email)
  await page.getByLabel(/^password/i).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).not.toHaveURL(/sign-in/)
}
