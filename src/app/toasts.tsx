import { Toaster } from 'sonner'

/** Below the bar at the top, so that its links stay in reach, and clear of the thumb’s buttons. */
const clearOfBar = { top: 72, left: 16, right: 16 }

/** Where short notices appear. */
export default function Toasts() {
  return (
    <Toaster
      position="top-center"
      offset={clearOfBar}
      mobileOffset={clearOfBar}
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
