import { describe, expect, it } from 'vitest'
import { ApiError, offline } from '@/lib/api-error'
import { allowed, refusalAt, whyNotSaved } from '@/lib/refusal'

const schema = new ApiError('not-valid', 400, 'takeUp: Too small', [
  { path: 'takeUp', message: 'Too small: expected number to be >=1' },
])
const taken = new ApiError('fitting-id-taken', 409, 'There is one.', [
  { path: 'id', message: 'There is a fitting with the id a already.' },
])

describe('a refusal at a field', () => {
  it('says what may be written where the schema refused it', () => {
    expect(refusalAt(schema, 'takeUp', allowed.above)).toBe('Write a length above zero.')
  })

  it('gives the server’s own sentence otherwise', () => {
    expect(refusalAt(taken, 'id', allowed.id)).toBe('There is a fitting with the id a already.')
  })

  it('stays away from other fields, and without an error', () => {
    expect(refusalAt(schema, 'body', allowed.above)).toBeUndefined()
    expect(refusalAt(null, 'takeUp', allowed.above)).toBeUndefined()
  })
})

it('counts the fields above the form, and leaves other errors as they are', () => {
  expect(whyNotSaved(schema)).toContain('One field needs another look.')
  expect(whyNotSaved(offline())).toBe(offline().message)
})
