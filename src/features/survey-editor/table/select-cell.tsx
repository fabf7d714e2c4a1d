interface SelectCellProps {
  label: string
  value: string
  choices: readonly { value: string; label: string }[]
  onChange: (value: string) => void
  disabled: boolean
}

export function SelectCell({ label, value, choices, onChange, disabled }: SelectCellProps) {
  return (
    <select
      aria-label={label}
      className="min-h-12 w-full min-w-24 rounded border border-rule bg-card px-1 focus:border-chalk disabled:border-transparent disabled:opacity-100"
      value={value}
      disabled={disabled}
      onChange={(event) => onChange(event.target.value)}
    >
      {choices.map((choice) => (
        <option key={choice.value} value={choice.value}>
          {choice.label}
        </option>
      ))}
    </select>
  )
}
