import { type ReactNode, useEffect } from 'react'
import { Brand, TautLine } from '@/components/taut-line'

/** The frame of the pages before sign-in. */
export function EntryPage({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Tautbook`
  }, [title])
  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-md flex-col justify-center px-4 py-8">
      <Brand className="text-lg" />
      <h1 className="mt-6 text-xl font-semibold">{title}</h1>
      <TautLine className="mt-2 mb-6" />
      {children}
    </main>
  )
}
