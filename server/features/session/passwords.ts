import { dictionary } from '@zxcvbn-ts/language-common'
import bcrypt from 'bcryptjs'
import { AppError } from '../../errors'

/** Work factor: OWASP asks for at least 10. */
const COST = 11

const commonest = new Set(dictionary['passwords-common'])

/** Hashes a new password. @throws AppError 400 `password-common` when it is among the commonest. */
export function hashNewPassword(password: string, path: string): Promise<string> {
  if (commonest.has(password.toLowerCase())) {
    const message = 'This password is one of the commonest and would be guessed at once. Choose another.'
    throw new AppError(400, 'password-common', message, { fields: [{ path, message }] })
  }
  return bcrypt.hash(password, COST)
}

/** A hash of nothing anybody has, so that an unknown address takes as long as a wrong password. */
const nobody = bcrypt.hash('nobody has this password', COST)

/** Whether the password is the one; takes as long for a person without a password. bcrypt reads 72 bytes, so longer ones are refused, not cut. */
export async function passwordMatches(password: string, hash: string | null | undefined): Promise<boolean> {
  const readable = new TextEncoder().encode(password).length <= 72
  const matches = await bcrypt.compare(readable ? password : '', hash ?? (await nobody))
  return matches && readable && typeof hash === 'string'
}
