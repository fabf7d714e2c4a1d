import { useSyncExternalStore } from 'react'

function subscribe(listener: () => void): () => void {
  window.addEventListener('online', listener)
  window.addEventListener('offline', listener)
  return () => {
    window.removeEventListener('online', listener)
    window.removeEventListener('offline', listener)
  }
}

/** Says that the device has no connection, for as long as it has none. */
export function OfflineBanner() {
  const online = useSyncExternalStore(subscribe, () => navigator.onLine)
  if (online) return null
  return (
    <p
      role="status"
      className="bg-marker-ground px-4 py-2 text-center text-sm font-medium text-marker print:hidden"
    >
      No connection. What is on the screen stays; nothing new can be fetched or sent.
    </p>
  )
}
