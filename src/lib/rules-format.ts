import type { GuardRules } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'

/** Guard rules show their lengths in the units the code writes them in, to 1/64 in. */
export const formatOfRules = ({ units }: Pick<GuardRules, 'units'>): LengthFormat =>
  units.length === 'mm' ? { style: 'millimetres' } : { style: 'inches', finest: 64 }
