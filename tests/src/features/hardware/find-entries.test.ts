import { describe, expect, it } from 'vitest'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { findCables, findFittings } from '../../../../src/features/hardware/find-entries'

const entry = (key: string) => ({ key, retired: false, updatedAt: '2026-01-05T08:00:00.000Z' })
const fittings = starterHardware.fittings.map((fitting) => ({ ...entry(fitting.id), fitting }))
const cables = starterHardware.cables.map((cable) => ({ ...entry(cable.id), cable }))
const found = (search: string) => findFittings(fittings, search).map(({ key }) => key)

describe('finding fittings', () => {
  it('finds all of them, in their order, for nothing and for spaces', () => {
    expect(found('')).toEqual(fittings.map(({ key }) => key))
    expect(found('  ')).toEqual(fittings.map(({ key }) => key))
  })

  it('finds by name, id and material, whatever the case', () => {
    expect(found('STAIR')).toEqual(['sleeve-stair'])
    expect(found('lug-metal')).toEqual(['lug-metal'])
    expect(found('masonry')).toEqual(['plate-masonry'])
  })

  it('wants every word, in any order', () => {
    expect(found('hardwood short')).toEqual(['sleeve-short'])
    expect(found('short masonry')).toEqual([])
  })

  it('finds an accented name by plain letters', () => {
    const [first] = fittings
    const accented = { ...first!, fitting: { ...first!.fitting, name: 'Hülse, gerade' } }
    expect(findFittings([accented], 'hulse')).toEqual([accented])
  })
})

it('finds cables by id and construction', () => {
  expect(findCables(cables, 'c532').map(({ key }) => key)).toEqual(['c532'])
  expect(findCables(cables, '7X7')).toHaveLength(3)
  expect(findCables(cables, '1x19')).toEqual([])
})
