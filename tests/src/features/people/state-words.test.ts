import { expect, it } from 'vitest'
import { stateWords } from '../../../../src/features/people/state-words'

it('says whether a person can sign in', () => {
  expect(stateWords({ state: 'disabled', lastSignIn: '2026-05-04T10:00:00Z' })).toMatch(/^Disabled: cannot/)
  expect(stateWords({ state: 'invited', lastSignIn: null })).toMatch(/^Invited: .*one-time link/)
  expect(stateWords({ state: 'active', lastSignIn: null })).toBe('Active: has not signed in yet.')
})

it('says when they last did', () => {
  expect(stateWords({ state: 'active', lastSignIn: '2026-05-04T12:00:00Z' })).toMatch(
    /last signed in .*2026\.$/,
  )
})
