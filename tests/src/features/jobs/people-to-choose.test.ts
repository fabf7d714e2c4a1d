import { describe, expect, it } from 'vitest'
import type { Person } from '@shared/schemas/person'
import { peopleToChoose } from '../../../../src/features/jobs/people-to-choose'

const person = (id: string, state: Person['state']): Person => ({
  id,
  name: `Name of ${id}`,
  email: `${id}@example.com`,
  roles: ['surveyor'],
  state,
  lastSignIn: null,
})
const people = [person('ada', 'active'), person('bo', 'invited'), person('cy', 'disabled')]
const ids = (choices: { id: string }[]) => choices.map(({ id }) => id)

describe('peopleToChoose', () => {
  it('offers a new job to nobody who is disabled', () => {
    expect(ids(peopleToChoose(people))).toEqual(['ada', 'bo'])
  })

  it('keeps the person a job is with, though they are disabled', () => {
    expect(ids(peopleToChoose(people, { personId: 'cy', personName: 'Name of cy' }))).toEqual([
      'ada',
      'bo',
      'cy',
    ])
  })

  it('keeps them while the people have not been fetched', () => {
    expect(peopleToChoose([], { personId: 'ada', personName: 'Ada' })).toEqual([{ id: 'ada', name: 'Ada' }])
  })

  it('names nobody twice', () => {
    expect(ids(peopleToChoose(people, { personId: 'ada', personName: 'Ada' }))).toEqual(['ada', 'bo'])
  })
})
