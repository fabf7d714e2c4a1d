import { roleMeanings, roles, type Role } from '@shared/permissions/roles'
import { Checkbox, CheckboxGroup } from '@/components/choices'

interface RoleChecksProps {
  value: readonly Role[]
  onChange: (roles: Role[]) => void
  error?: string | undefined
}

/** Roles, several at once, each with what it means. */
export function RoleChecks({ value, onChange, error }: RoleChecksProps) {
  return (
    <CheckboxGroup label="Roles" error={error}>
      {roles.map((role, i) => (
        <Checkbox
          key={role}
          label={role}
          hint={roleMeanings[role]}
          // The first of them is where a refusal leads the keyboard.
          aria-invalid={i === 0 && error !== undefined}
          checked={value.includes(role)}
          onChange={(event) =>
            onChange(event.target.checked ? [...value, role] : value.filter((held) => held !== role))
          }
        />
      ))}
    </CheckboxGroup>
  )
}
