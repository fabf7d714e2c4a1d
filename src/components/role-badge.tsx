import type { Role } from '@shared/schemas/role'

/** What somebody does in the company, as a word in a frame: no colour stands for a role. */
export function RoleBadge({ role }: { role: Role }) {
  return (
    <span className="inline-flex h-6 items-center rounded border border-rule bg-card px-2 text-sm font-medium">
      {role}
    </span>
  )
}
