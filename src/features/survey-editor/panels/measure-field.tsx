import { type ComponentProps, useState } from 'react'
import { LengthField } from '@/components/length-field'
import { type Least, lengthFault } from './length-bounds'

type MeasureFieldProps = Omit<ComponentProps<typeof LengthField>, 'error'> & { least?: Least }

/** A length of the survey: what the survey cannot hold is said at the field and not taken over. */
export function MeasureField({ least, onChange, ...field }: MeasureFieldProps) {
  const [fault, setFault] = useState<string>()
  return (
    <LengthField
      {...field}
      error={fault}
      onChange={(value) => {
        const wrong = value === undefined ? undefined : lengthFault(value, least)
        setFault(wrong)
        if (wrong === undefined) onChange(value)
      }}
    />
  )
}
