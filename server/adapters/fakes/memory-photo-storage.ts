import { checkPhotoKey, type PhotoStorage } from '../photo-storage'

export interface MemoryPhotoStorage extends PhotoStorage {
  keys: () => string[]
  /** The next write fails, as on a full disk. */
  failNextWrite: () => void
}

/** Keeps pictures in memory, for tests. */
export function memoryPhotoStorage(): MemoryPhotoStorage {
  const kept = new Map<string, Buffer>()
  let failing = false
  return {
    write: (key, bytes) => {
      checkPhotoKey(key)
      if (failing) {
        failing = false
        return Promise.reject(new Error('ENOSPC: no space left on device'))
      }
      kept.set(key, Buffer.from(bytes))
      return Promise.resolve()
    },
    read: (key) => Promise.resolve(kept.get(key)),
    remove: (key) => {
      kept.delete(key)
      return Promise.resolve()
    },
    keys: () => [...kept.keys()],
    failNextWrite: () => {
      failing = true
    },
  }
}
