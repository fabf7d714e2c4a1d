import type { Cable } from '../../schemas/hardware'

/*
 * ABCB Housing Provisions Standard 2022 (1 May 2023), clause 11.3.6. © Commonwealth of Australia and the States and
 * Territories 2022, published by the Australian Building Codes Board, CC BY-ND 4.0: figures quoted as they stand.
 * `null` is the table's `x`: not allowed. Results of tests, one by one: to be looked up, never interpolated or fitted.
 */

/** One row of a table: a wire at a spacing, mm; `values` by clear distance between posts. */
export interface WireRow {
  diameter: number
  spacing: number
  values: readonly (number | null)[]
}

/** Clear distances between posts of table 11.3.6a, mm. */
export const tensionDistances = [600, 800, 900, 1000, 1200, 1500, 1800, 2000, 2500] as const

/** Table 11.3.6a: least tension of horizontal stainless wires, N. */
export const tensionRows: readonly (WireRow & { lay: Cable['construction'] })[] = [
  { diameter: 2.5, lay: '7x7', spacing: 60, values: [55, 190, 263, 415, 478, 823, 1080, 1139, null] },
  { diameter: 2.5, lay: '7x7', spacing: 80, values: [382, 630, 730, 824, 1025, 1288, null, null, null] },
  { diameter: 2.5, lay: '7x7', spacing: 100, values: [869, 1218, 1368, null, null, null, null, null, null] },
  { diameter: 2.5, lay: '1x19', spacing: 60, values: [35, 218, 310, 402, 585, 810, 1125, 1325, null] },
  { diameter: 2.5, lay: '1x19', spacing: 80, values: [420, 630, 735, 840, 1050, 1400, 1750, null, null] },
  {
    diameter: 2.5,
    lay: '1x19',
    spacing: 100,
    values: [1140, 1565, null, null, null, null, null, null, null],
  },
  { diameter: 3, lay: '7x7', spacing: 60, values: [15, 178, 270, 314, 506, 660, 965, 1168, 1491] },
  { diameter: 3, lay: '7x7', spacing: 80, values: [250, 413, 500, 741, 818, 1083, 1370, 1565, null] },
  { diameter: 3, lay: '7x7', spacing: 100, values: [865, 1278, 1390, 1639, null, null, null, null, null] },
  { diameter: 3, lay: '1x19', spacing: 60, values: [25, 183, 261, 340, 520, 790, 1025, 1180, null] },
  { diameter: 3, lay: '1x19', spacing: 80, values: [325, 555, 670, 785, 1025, 1330, 1725, 1980, null] },
  { diameter: 3, lay: '1x19', spacing: 100, values: [1090, 1500, 1705, 1910, null, null, null, null, null] },
  { diameter: 4, lay: '7x7', spacing: 60, values: [5, 73, 97, 122, 235, 440, 664, 813, 1178] },
  { diameter: 4, lay: '7x7', spacing: 80, values: [196, 422, 480, 524, 760, 1100, 1358, 1530, 2130] },
  { diameter: 4, lay: '7x7', spacing: 100, values: [835, 1182, 1360, 1528, 1837, 2381, 2811, 3098, null] },
  { diameter: 4, lay: '1x19', spacing: 60, values: [5, 5, 10, 15, 20, 147, 593, 890, 1280] },
  { diameter: 4, lay: '1x19', spacing: 80, values: [30, 192, 300, 415, 593, 1105, 1303, 1435, 1844] },
  { diameter: 4, lay: '1x19', spacing: 100, values: [853, 1308, 1487, 1610, 2048, 2608, 3094, 3418, 3849] },
  { diameter: 4, lay: '7x19', spacing: 60, values: [155, 290, 358, 425, 599, 860, 1080, 1285, 1540] },
  { diameter: 4, lay: '7x19', spacing: 80, values: [394, 654, 785, 915, 1143, 1485, 1860, 2105, 2615] },
  { diameter: 4, lay: '7x19', spacing: 100, values: [1038, 1412, 1598, 1785, 2165, 2735, null, null, null] },
]

/** Clear distances between posts of table 11.3.6b, mm. */
export const deflectionDistances = [600, 900, 1200, 1500, 1800, 2000] as const

/** Table 11.3.6b: largest deflection of each continuous wire with 2 kg hung at mid-span, mm. */
export const deflectionRows: readonly WireRow[] = [
  { diameter: 2.5, spacing: 60, values: [17, 11, 9, 8, 8, 8] },
  { diameter: 2.5, spacing: 80, values: [7, 5, 5, 5, null, null] },
  { diameter: 3, spacing: 60, values: [19, 13, 8, 7, 7, 7] },
  { diameter: 3, spacing: 80, values: [8, 6, 6, 5, 5, 5] },
  { diameter: 4, spacing: 60, values: [18, 12, 8, 8, 7, 7] },
  { diameter: 4, spacing: 80, values: [8, 6, 4, 4, 4, 4] },
]
