import { Link } from 'react-router-dom'

interface GuardRulesLineProps {
  /** Name and edition; undefined for rules that are not known. */
  name: string | undefined
  to: string
}

/** Which guard rules were followed, and who decides. */
export const GuardRulesLine = ({ name, to }: GuardRulesLineProps) => (
  <p className="text-sm text-soft">
    Guard rules: {name ? <Link to={to}>{name}</Link> : 'not known here'}. Confirm with the authority having
    jurisdiction.
  </p>
)
