import type { ComponentProps } from 'react'
import { LengthField } from '@/components/length-field'
import { type Least, lengthFault } from './length-bounds'

type MeasureFieldProps = Omit<ComponentProps<typeof LengthField>, 'error' | 'refuse'> & { least?: Least }

/** A length of the survey: what the survey cannot hold stays in the field with the reason and is not taken over. */
export const MeasureField = ({ least, ...field }: MeasureFieldProps) => (
  <LengthField {...field} refuse={(value) => lengthFault(value, least)} />
)
