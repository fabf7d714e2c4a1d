import { AppError } from '../../errors'

export function emailTaken(): AppError {
  const message = 'This e-mail address signs in already. Use another, or ask its owner to sign in.'
  return new AppError(409, 'email-taken', message, { fields: [{ path: 'email', message }] })
}

export const lastOwner = () =>
  new AppError(
    409,
    'last-owner',
    'This is the company’s last active owner. Make somebody else an owner first; nothing was changed.',
  )

export const linkUsedUp = () =>
  new AppError(
    404,
    'link-used-up',
    'This link has been used, replaced or has expired. Ask the owner of your company for a new one.',
  )
