import { Checkbox } from '@/components/choices'

interface CheckListProps<Value extends string> {
  label: string
  choices: readonly { value: Value; label: string }[]
  value: readonly Value[]
  onChange: (value: Value[]) => void
  error?: string | undefined
}

/** Several of a few. */
export function CheckList<Value extends string>({
  label,
  choices,
  value,
  onChange,
  error,
}: CheckListProps<Value>) {
  return (
    <fieldset>
      <legend className="text-sm font-medium text-soft">{label}</legend>
      <div className="flex flex-wrap gap-x-6">
        {choices.map((choice) => (
          <Checkbox
            key={choice.value}
            label={choice.label}
            checked={value.includes(choice.value)}
            onChange={(event) =>
              onChange(
                event.target.checked
                  ? [...value, choice.value]
                  : value.filter((each) => each !== choice.value),
              )
            }
          />
        ))}
      </div>
      {error ? (
        <p role="alert" className="text-sm font-medium text-stop">
          {error}
        </p>
      ) : null}
    </fieldset>
  )
}
