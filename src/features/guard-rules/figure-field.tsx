import type { FigureSource } from '@shared/schemas/guard-rules'
import type { Length } from '@shared/units/length'
import type { LengthFormat } from '@shared/units/format-length'
import { TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { asOwn } from './own-copy'

type Figure = FigureSource & { value: Length }

interface FigureFieldProps {
  label: string
  figure: Figure | undefined
  format: LengthFormat
  /** It may not be left empty. */
  required?: boolean
  error?: string | undefined
  onChange: (figure: Figure | undefined) => void
}

/** A length of the rules and the section it stands in. */
export const FigureField = ({ label, figure, format, required, error, onChange }: FigureFieldProps) => (
  <div className="grid grid-cols-2 gap-3">
    <LengthField
      label={label}
      value={figure?.value}
      format={format}
      required={required === true}
      error={error}
      onChange={(value) => {
        if (value !== figure?.value) onChange(value === undefined ? undefined : asOwn(value, figure))
      }}
    />
    <SectionField
      of={label}
      source={figure}
      onChange={(section) => figure && onChange({ ...figure, section })}
    />
  </div>
)

interface SectionFieldProps {
  of: string
  source: FigureSource | undefined
  onChange: (section: string) => void
}

/** Where a figure stands: a section, a by-law, a letter. */
export const SectionField = ({ of, source, onChange }: SectionFieldProps) => (
  <TextField
    label="Section"
    aria-label={`Section of: ${of}`}
    value={source?.section ?? ''}
    disabled={!source}
    maxLength={120}
    onChange={(event) => onChange(event.target.value)}
  />
)
