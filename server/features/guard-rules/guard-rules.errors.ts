import { AppError, notFound } from '../../errors'

export const noSuchRules = () => notFound('set of guard rules')

export const rulesIdTaken = (id: string, published: boolean) => {
  const message = published
    ? `${id} is the id of published rules, which stay as they are. Choose another id for your own.`
    : `You have guard rules with the id ${id} already, perhaps retired ones. Choose another id.`
  return new AppError(409, 'guard-rules-id-taken', message, { fields: [{ path: 'id', message }] })
}

export const rulesIdChanged = (id: string) => {
  const message = `The id of guard rules stays: surveys name them as ${id}. Copy them for another id.`
  return new AppError(422, 'guard-rules-id-changed', message, { fields: [{ path: 'id', message }] })
}
