import type { ReactNode } from 'react'

/** A table that is typed into; wider than the screen it scrolls inside itself. */
export function Sheetlike({
  caption,
  headers,
  children,
}: {
  caption: string
  headers: readonly string[]
  children: ReactNode
}) {
  return (
    <div
      className="relative overflow-x-auto rounded border border-rule bg-card"
      role="group"
      aria-label={caption}
      tabIndex={0}
    >
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-rule">
            {headers.map((header, i) => (
              <th key={header || i} scope="col" className="px-3 py-2 text-sm font-medium text-soft">
                {header || <span className="sr-only">Remove</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </div>
  )
}
