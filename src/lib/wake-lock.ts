import { useEffect } from 'react'

/** Keeps the screen awake while a page is in front, where the browser can. */
export function useWakeLock(): void {
  useEffect(() => {
    let lock: WakeLockSentinel | null = null
    let gone = false
    const hold = async () => {
      if (document.visibilityState !== 'visible' || !('wakeLock' in navigator)) return
      try {
        const held = await navigator.wakeLock.request('screen')
        if (gone) await held.release()
        else lock = held
      } catch {
        // The battery saver may refuse; the page works all the same.
      }
    }
    const again = () => void hold()
    again()
    document.addEventListener('visibilitychange', again)
    return () => {
      gone = true
      document.removeEventListener('visibilitychange', again)
      void lock?.release()
    }
  }, [])
}
