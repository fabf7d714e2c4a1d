import { basisWords } from '@shared/calculation/guard-rules/published-rules'
import type { FigureSource } from '@shared/schemas/guard-rules'

/** Where a figure of guard rules stands, and how well it is known. */
export const RuleSource = ({ source: { section, basis } }: { source: FigureSource }) => (
  <span className="text-sm text-soft">
    {section},{' '}
    <span className={basis === 'copy' || basis === 'memory' ? 'font-medium text-marker' : undefined}>
      {basisWords[basis]}
    </span>
  </span>
)
