import { roleMeanings, roles, type Role } from '@shared/permissions/roles'
import { Checkbox } from '@/components/choices'

interface RoleChecksProps {
  value: readonly Role[]
  onChange: (roles: Role[]) => void
  error?: string | undefined
}

/** Roles, several at once, each with what it means. */
export function RoleChecks({ value, onChange, error }: RoleChecksProps) {
  return (
    <fieldset>
      <legend className="text-sm font-medium text-soft">Roles</legend>
      {roles.map((role) => (
        <Checkbox
          key={role}
          label={role}
          hint={roleMeanings[role]}
          checked={value.includes(role)}
          onChange={(event) =>
            onChange(event.target.checked ? [...value, role] : value.filter((held) => held !== role))
          }
        />
      ))}
      {error ? (
        <p role="alert" className="text-sm font-medium text-stop">
          {error}
        </p>
      ) : null}
    </fieldset>
  )
}
