import type { ReactNode } from 'react'

/** A strip across the page for what holds as long as it stands, such as having no connection. */
export function Banner({ children }: { children: ReactNode }) {
  return (
    <p
      role="status"
      className="bg-marker-ground px-4 py-2 text-center text-sm font-medium text-marker print:hidden"
    >
      {children}
    </p>
  )
}
