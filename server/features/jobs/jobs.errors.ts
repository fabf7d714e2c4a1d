import { AppError, notFound } from '../../errors'

export const noSuchJob = () => notFound('job')

export const notAPerson = () => {
  const message = 'Choose somebody who works in your company and is not disabled.'
  return new AppError(422, 'job-person-unknown', message, { fields: [{ path: 'personId', message }] })
}

export const pageUnknown = () => {
  const message = 'This page of the list is not known. Load the list again from its beginning.'
  return new AppError(400, 'job-page-unknown', message, { fields: [{ path: 'after', message }] })
}
