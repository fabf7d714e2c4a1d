import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'

/** How lengths are shown in a survey's units and a company's fraction. */
export const lengthFormat = (
  units: Units,
  fraction: 16 | 32 | 64,
  style: 'feet' | 'inches' = 'inches',
): LengthFormat => (units.length === 'mm' ? { style: 'millimetres' } : { style, finest: fraction })
