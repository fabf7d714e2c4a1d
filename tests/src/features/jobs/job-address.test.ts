import { describe, expect, it } from 'vitest'
import { changeJobAddress, isFiltered, readJobAddress } from '../../../../src/features/jobs/job-address'

const read = (query: string) => readJobAddress(new URLSearchParams(query))

describe('readJobAddress', () => {
  it('takes search, stage, person and order from the address', () => {
    expect(read('search=deck&stage=shop&with=p1&sort=due')).toEqual({
      search: 'deck',
      stage: 'shop',
      with: 'p1',
      sort: 'due',
    })
  })

  it('shows all jobs by last change when the address says nothing', () => {
    expect(read('')).toEqual({ search: '', stage: '', with: '', sort: 'updated' })
  })

  it('passes over a stage and an order that do not exist, and cuts words no server would take', () => {
    expect(read(`stage=paused&sort=colour&search=${'x'.repeat(200)}`)).toEqual({
      search: 'x'.repeat(120),
      stage: '',
      with: '',
      sort: 'updated',
    })
  })
})

describe('changeJobAddress', () => {
  const changed = (query: string, ...change: [Parameters<typeof changeJobAddress>[1], string]) =>
    changeJobAddress(new URLSearchParams(query), ...change).toString()

  it('changes one thing and keeps the others', () => {
    expect(changed('search=deck&stage=fit', 'stage', 'shop')).toBe('search=deck&stage=shop')
  })

  it('writes nothing that is as usual', () => {
    expect(changed('stage=fit', 'stage', '')).toBe('')
    expect(changed('sort=due', 'sort', 'updated')).toBe('')
  })

  it('leaves the address it was given alone', () => {
    const address = new URLSearchParams('stage=fit')
    changeJobAddress(address, 'stage', '')
    expect(address.toString()).toBe('stage=fit')
  })
})

it('is filtered by words, stage or person, not by order', () => {
  expect(
    ['search=a', 'stage=fit', 'with=p1', 'sort=due', ''].map((query) => isFiltered(read(query))),
  ).toEqual([true, true, true, false, false])
})
