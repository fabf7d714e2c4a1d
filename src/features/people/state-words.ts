import type { Person } from '@shared/schemas/person'
import { dateText } from '@/lib/date-text'

/** Whether a person can sign in, and when they last did. */
export function stateWords({ state, lastSignIn }: Pick<Person, 'state' | 'lastSignIn'>): string {
  if (state === 'disabled') return 'Disabled: cannot sign in.'
  if (state === 'invited') return 'Invited: has not used the one-time link yet.'
  return lastSignIn ? `Active: last signed in ${dateText(lastSignIn)}.` : 'Active: has not signed in yet.'
}
