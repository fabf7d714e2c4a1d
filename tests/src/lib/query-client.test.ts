import { expect, test } from 'vitest'
import { ApiError, offline, unreadable } from '@/lib/api-error'
import { mayRetry, queryClient } from '@/lib/query-client'

const refused = (status: number) => new ApiError('some-code', status, 'No.')

test.each([400, 401, 403, 404, 409, 422, 429])('never asks again after %i', (status) => {
  expect(mayRetry(0, refused(status))).toBe(false)
})

test.each([
  ['silence', offline()],
  ['an answer that is not the server’s', unreadable()],
  ['a stumble', refused(503)],
  ['a fault of the page', new Error('Broken')],
])('asks twice more after %s', (_name, error) => {
  expect([0, 1, 2].map((failures) => mayRetry(failures, error))).toEqual([true, true, false])
})

test('requests fail without a connection instead of waiting, and come back with it', () => {
  const { queries, mutations } = queryClient.getDefaultOptions()
  expect(queries).toMatchObject({ networkMode: 'always', refetchOnReconnect: true })
  expect(mutations).toMatchObject({ networkMode: 'always', retry: false })
})
