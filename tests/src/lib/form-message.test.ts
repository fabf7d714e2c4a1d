import { expect, it } from 'vitest'
import { ApiError } from '../../../src/lib/api-error'
import { formMessage } from '../../../src/lib/form-message'

const refused = (...paths: string[]) =>
  new ApiError(
    'not-valid',
    400,
    'Two things are not right.',
    paths.map((path) => ({ path, message: 'No.' })),
  )

it('says nothing beside the fields when each fault stands at its field', () => {
  expect(formMessage(refused('name', 'email'), ['name', 'email', 'roles'])).toBeUndefined()
})

it('says it when a fault has no field in the form, or the refusal names none', () => {
  expect(formMessage(refused('name', 'units'), ['name'])).toBe('Two things are not right.')
  expect(formMessage(refused(), ['name'])).toBe('Two things are not right.')
})

it('says nothing when nothing is wrong', () => {
  expect(formMessage(null, ['name'])).toBeUndefined()
})
