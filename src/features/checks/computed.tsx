import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'

/** A length that was worked out. */
export const Computed = ({ value, format }: { value: number; format: LengthFormat }) => (
  <Length value={value} format={format} look="computed" />
)
