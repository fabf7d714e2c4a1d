import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { leastWireTension, mostWireDeflection, type Wire } from '@shared/calculation/checks/wire-tables'
import { deflectionRows, tensionRows } from '@shared/calculation/checks/wire-table-data'
import { millimetres } from '@shared/units/length'

interface Row {
  dia_mm: number
  lay: Wire['construction']
  spacing_mm: number
  N: (number | null)[]
  mm: (number | null)[]
}
interface Table {
  clear_distance_between_posts_mm: number[]
  rows: Row[]
}
/** ABCB Housing Provisions Standard 2022, clause 11.3.6: the figures as published, in a file of their own. */
const published = JSON.parse(readFileSync('tests/check-values/ncc-2022-wire-barriers.json', 'utf8')) as {
  table_11_3_6a: Table
  table_11_3_6b: Table
}
const mm = (value: number) => millimetres(value)
const wireOf = ({ dia_mm: diameter, lay }: Pick<Row, 'dia_mm' | 'lay'>): Wire => ({
  construction: lay,
  diameter: mm(diameter),
})
const answer = (value: number | null | undefined, spacing: number, distance: number) =>
  value === null ? { found: 'not-allowed', spacing, distance } : { found: 'value', value, spacing, distance }

describe('table 11.3.6a, least tension', () => {
  const { rows, clear_distance_between_posts_mm: distances } = published.table_11_3_6a
  const cells = rows.flatMap((row) => distances.map((distance, i) => ({ row, distance, value: row.N[i] })))

  it('has every row and column', () => {
    expect(cells).toHaveLength(tensionRows.length * 9)
  })
  it.each(cells)(
    '$row.dia_mm mm $row.lay at $row.spacing_mm over $distance: $value',
    ({ row, distance, value }) => {
      const { spacing_mm: spacing } = row
      expect(leastWireTension(wireOf(row), mm(spacing), mm(distance))).toEqual(
        answer(value, spacing, distance),
      )
    },
  )
})

describe('table 11.3.6b, largest deflection under 2 kg', () => {
  const { rows, clear_distance_between_posts_mm: distances } = published.table_11_3_6b
  const cells = rows.flatMap((row) => distances.map((distance, i) => ({ row, distance, value: row.mm[i] })))

  it('has every row and column', () => {
    expect(cells).toHaveLength(deflectionRows.length * 6)
  })
  it.each(cells)('$row.dia_mm mm at $row.spacing_mm over $distance: $value', ({ row, distance, value }) => {
    const { spacing_mm: spacing } = row
    const wire = wireOf({ ...row, lay: '7x7' })
    expect(mostWireDeflection(wire, mm(spacing), mm(distance))).toEqual(answer(value, spacing, distance))
  })
})

describe('between the tabulated values', () => {
  const wire: Wire = { construction: '7x7', diameter: mm(3) }

  it('takes the next greater spacing and distance, never one between', () => {
    // 3.0 mm 7x7: 80 mm over 1200 mm is 818 N; 60 mm over 1200 mm 506 N; 80 mm over 1500 mm 1083 N.
    expect(leastWireTension(wire, mm(60), mm(1200))).toMatchObject({ value: 506 })
    expect(leastWireTension(wire, mm(60) + 1000, mm(1200))).toMatchObject({ value: 818, spacing: 80 })
    expect(leastWireTension(wire, mm(70), mm(1100))).toMatchObject({
      value: 818,
      spacing: 80,
      distance: 1200,
    })
    expect(leastWireTension(wire, mm(80), mm(1200))).toMatchObject({ value: 818 })
    expect(leastWireTension(wire, mm(80), mm(1200) + 1000)).toMatchObject({ value: 1083, distance: 1500 })
    expect(leastWireTension(wire, mm(10), mm(10))).toMatchObject({ spacing: 60, distance: 600 })
  })
  it('goes on to an x rather than back to a value', () => {
    // 3.0 mm 7x7 at 100 mm: 1639 N over 1000 mm, x over 1200 mm.
    expect(leastWireTension(wire, mm(100), mm(1000))).toMatchObject({ value: 1639 })
    expect(leastWireTension(wire, mm(100), mm(1001))).toEqual({
      found: 'not-allowed',
      spacing: 100,
      distance: 1200,
    })
  })
  it('answers nothing outside of the tables', () => {
    expect(leastWireTension(wire, mm(100.1), mm(600))).toEqual({ found: 'not-tabulated', because: 'spacing' })
    expect(leastWireTension(wire, mm(60), mm(2500.1))).toEqual({
      found: 'not-tabulated',
      because: 'distance',
    })
    expect(leastWireTension({ ...wire, diameter: mm(3.175) }, mm(60), mm(600))).toMatchObject({
      because: 'wire',
    })
    expect(leastWireTension({ ...wire, construction: '7x19' }, mm(60), mm(600))).toMatchObject({
      because: 'wire',
    })
  })
})
