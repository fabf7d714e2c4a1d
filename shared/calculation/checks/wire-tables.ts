import type { Cable } from '../../schemas/hardware'
import { NM_PER_MILLIMETRE } from '../../units/length'
import {
  deflectionDistances,
  deflectionRows,
  tensionDistances,
  tensionRows,
  type WireRow,
} from './wire-table-data'

/** What a table says: a value, `x`, or nothing because wire, spacing or distance lie outside of it. */
export type LookedUp =
  | { found: 'value'; value: number; spacing: number; distance: number }
  | { found: 'not-allowed'; spacing: number; distance: number }
  | { found: 'not-tabulated'; because: 'wire' | 'spacing' | 'distance' }

export interface Wire {
  construction: Cable['construction']
  /** nm */
  diameter: number
}

/** A wire is that of a row when it is as thick to this much, mm: a tenth is another wire. */
const SAME_WIRE = 0.05
/** Noise of the conversion, mm. */
const NOISE = 1e-6

/**
 * The least tension of a horizontal stainless wire under NCC 2022.
 *
 * Formula: a look-up: the row of this wire and the next greater tabulated spacing, the column of the next greater tabulated
 * distance. Never interpolated; what lies outside the table is not tabulated.
 * Units: nm in, N out; spacing centre to centre, distance clear between posts (or spacers).
 * Source: ABCB Housing Provisions 2022, table 11.3.6a.
 *
 * @example 3.0 mm 7x7 at 80 mm over 1200 mm: 818 N; at 70 mm over 1100 mm the same
 */
export const leastWireTension = (wire: Wire, spacing: number, distance: number): LookedUp =>
  lookUp(
    tensionRows.filter((row) => row.lay === wire.construction && isSame(row, wire)),
    tensionDistances,
    { spacing, distance },
  )

/**
 * The largest deflection of a continuous wire with 2 kg hung at mid-span under NCC 2022: how its tension is proved.
 *
 * Formula: a look-up, as for the least tension; the lay does not matter.
 * Units: nm in, mm out.
 * Source: ABCB Housing Provisions 2022, table 11.3.6b.
 *
 * @example 3.0 mm at 80 mm over 1200 mm: 6 mm
 */
export const mostWireDeflection = (wire: Wire, spacing: number, distance: number): LookedUp =>
  lookUp(
    deflectionRows.filter((row) => isSame(row, wire)),
    deflectionDistances,
    { spacing, distance },
  )

const isSame = (row: WireRow, { diameter }: Wire): boolean =>
  Math.abs(row.diameter - diameter / NM_PER_MILLIMETRE) <= SAME_WIRE

function lookUp(
  rows: readonly WireRow[],
  distances: readonly number[],
  { spacing, distance }: { spacing: number; distance: number },
): LookedUp {
  if (rows.length === 0) return { found: 'not-tabulated', because: 'wire' }
  const wide = spacing / NM_PER_MILLIMETRE - NOISE
  const far = distance / NM_PER_MILLIMETRE - NOISE
  const row = rows.filter((each) => each.spacing >= wide).sort((a, b) => a.spacing - b.spacing)[0]
  if (!row) return { found: 'not-tabulated', because: 'spacing' }
  const column = distances.findIndex((each) => each >= far)
  const tabulated = distances[column]
  if (tabulated === undefined) return { found: 'not-tabulated', because: 'distance' }
  const at = { spacing: row.spacing, distance: tabulated }
  const value = row.values[column]
  return value === null || value === undefined
    ? { found: 'not-allowed', ...at }
    : { found: 'value', value, ...at }
}
