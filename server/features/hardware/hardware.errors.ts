import { AppError, notFound } from '../../errors'
import type { EntryKind } from '../../database/catalogue-entries.queries'

export const noSuchEntry = (kind: EntryKind) => notFound(kind)

export const idTaken = (kind: EntryKind, id: string) => {
  const message = `There is a ${kind} with the id ${id} already, perhaps a retired one. Choose another id.`
  return new AppError(409, `${kind}-id-taken`, message, { fields: [{ path: 'id', message }] })
}

export const idChanged = (kind: EntryKind, id: string) => {
  const message = `The id of a ${kind} stays: surveys name it as ${id}. Add a new ${kind} for another id.`
  return new AppError(422, `${kind}-id-changed`, message, { fields: [{ path: 'id', message }] })
}

export const unknownCables = (ids: string[]) => {
  const message = `Your hardware has no cable ${ids.join(', ')}. Add it first, or take it off the fitting.`
  return new AppError(422, 'fitting-cable-unknown', message, { fields: [{ path: 'cables', message }] })
}
