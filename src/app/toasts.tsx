import { Toaster } from 'sonner'

/** Where short notices appear: at the top on a phone, clear of the thumb's buttons. */
export default function Toasts() {
  return (
    <Toaster
      position="top-center"
      toastOptions={{
        style: {
          background: 'var(--card)',
          color: 'var(--ink)',
          border: '1px solid var(--rule)',
          borderRadius: 6,
          fontFamily: 'Barlow, system-ui, sans-serif',
          fontSize: 16,
        },
      }}
    />
  )
}
