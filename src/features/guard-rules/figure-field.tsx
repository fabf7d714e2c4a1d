import { basisWords } from '@shared/calculation/guard-rules/published-rules'
import type { FigureSource } from '@shared/schemas/guard-rules'
import type { Length } from '@shared/units/length'
import type { LengthFormat } from '@shared/units/format-length'
import { TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { allowed, refusalAt } from '@/lib/refusal'
import { asOwn } from './own-copy'

type Figure = FigureSource & { value: Length }

interface FigureFieldProps {
  label: string
  /** Where the figure is in the rules, for what the server says of it. */
  path: string
  figure: Figure | undefined
  format: LengthFormat
  /** It may not be left empty. */
  required?: boolean
  error: unknown
  onChange: (figure: Figure | undefined) => void
}

/** A length of the rules and the section it stands in. */
export const FigureField = ({ label, path, figure, format, required, error, onChange }: FigureFieldProps) => (
  <div className="grid grid-cols-2 gap-3">
    <LengthField
      label={label}
      value={figure?.value}
      format={format}
      required={required === true}
      error={refusalAt(error, `${path}.value`, allowed.above)}
      onChange={(value) => {
        if (value !== figure?.value) onChange(value === undefined ? undefined : asOwn(value, figure))
      }}
    />
    <SectionField
      of={label}
      source={figure}
      error={refusalAt(error, `${path}.section`, sectionAllowed)}
      onChange={(source) => figure && onChange({ ...figure, ...source })}
    />
  </div>
)

export const sectionAllowed = 'Write where the figure stands, or “own rule”.'

interface SectionFieldProps {
  of: string
  source: FigureSource | undefined
  error: string | undefined
  onChange: (source: FigureSource) => void
}

/** Where a figure stands: a section, a by-law, a letter. One that was written here is the company’s own. */
export const SectionField = ({ of, source, error, onChange }: SectionFieldProps) => (
  <TextField
    label="Section"
    aria-label={`Section of: ${of}`}
    hint={source && basisWords[source.basis]}
    value={source?.section ?? ''}
    error={error}
    // Not disabled: the keyboard would pass by while the figure before it is being written.
    readOnly={!source}
    maxLength={120}
    onChange={(event) => onChange({ section: event.target.value, basis: 'own' })}
  />
)
