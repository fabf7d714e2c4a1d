import { Checkbox, CheckboxGroup } from '@/components/choices'

interface CheckListProps<Value extends string> {
  label: string
  hint: string
  choices: readonly { value: Value; label: string }[]
  value: readonly Value[]
  onChange: (value: Value[]) => void
  error?: string | undefined
}

/** Several of a few; what is ticked and not among the choices stays. */
export function CheckList<Value extends string>(props: CheckListProps<Value>) {
  const { label, hint, choices, value, onChange, error } = props
  const turn = (turned: Value, on: boolean) =>
    onChange(on ? [...value, turned] : value.filter((each) => each !== turned))
  return (
    <CheckboxGroup label={label} hint={hint} error={error}>
      <div className="flex flex-wrap gap-x-6">
        {choices.map((choice) => (
          <Checkbox
            key={choice.value}
            label={choice.label}
            checked={value.includes(choice.value)}
            onChange={(event) => turn(choice.value, event.target.checked)}
          />
        ))}
      </div>
    </CheckboxGroup>
  )
}
