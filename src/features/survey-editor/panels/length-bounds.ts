import type { Length } from '@shared/units/length'

/** The least a field may hold. */
export type Least = 'above-zero' | 'zero'

/** Why a length cannot be kept, said before it is sent: what the server refuses takes others sent with it along. */
export function lengthFault(length: Length, least: Least = 'above-zero'): string | undefined {
  if (length < 0) return 'A length cannot be below zero. Write it without the minus.'
  if (length === 0 && least === 'above-zero')
    return 'A length of zero cannot be kept. Write what the tape says.'
  return undefined
}
