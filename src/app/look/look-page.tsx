import { useState } from 'react'
import { ChoiceGroup } from '@/components/choices'
import { Page } from '@/components/page'
import { SkipLink } from '@/components/skip-link'
import { applyTheme, readTheme, type Theme } from '@/lib/theme'
import { ActionParts } from './action-parts'
import { FieldParts } from './field-parts'
import { FigureParts } from './figure-parts'
import { StateParts } from './state-parts'
import { TableParts } from './table-parts'
import Toasts from '../toasts'

/** Every part on one page, for looking at while they are made. Not in the built client. */
export function Component() {
  const [theme, setTheme] = useState(readTheme)
  const choose = (next: Theme) => {
    applyTheme(next)
    setTheme(next)
  }
  return (
    <>
      <SkipLink />
      <main id="content" tabIndex={-1}>
        <Page title="The look" above="For development">
          <div className="grid gap-4">
            <ChoiceGroup
              label="Colours"
              value={theme}
              onChange={choose}
              choices={[
                { value: 'system', label: 'as the device' },
                { value: 'light', label: 'light' },
                { value: 'dark', label: 'dark' },
              ]}
            />
            <FigureParts />
            <ActionParts />
            <FieldParts />
            <TableParts />
            <StateParts />
          </div>
        </Page>
      </main>
      <Toasts />
    </>
  )
}
