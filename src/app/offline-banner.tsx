import { useSyncExternalStore } from 'react'
import { Banner } from '@/components/banner'

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
  return <Banner>No connection. What is on the screen stays; nothing new can be fetched or sent.</Banner>
}
