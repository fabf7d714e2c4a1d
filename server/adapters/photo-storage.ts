import { randomUUID } from 'node:crypto'
import { mkdir, open, readFile, rename, rm, rmdir } from 'node:fs/promises'
import path from 'node:path'

/** Where pictures are kept. Keys are `company/photo/size.jpg`; the company comes first so that no key crosses companies. */
export interface PhotoStorage {
  write: (key: string, bytes: Uint8Array) => Promise<void>
  /** Undefined when nothing is kept under the key. */
  read: (key: string) => Promise<Buffer | undefined>
  /** Removing what is not there is no error. */
  remove: (key: string) => Promise<void>
}

export type PictureSize = 'picture' | 'thumbnail'

export const photoKey = (companyId: string, photoId: string, size: PictureSize): string =>
  `${companyId}/${photoId}/${size}.jpg`

const uuid = '[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}'
const keyPattern = new RegExp(`^${uuid}/${uuid}/(picture|thumbnail)\\.jpg$`)

/** @throws RangeError for anything that `photoKey` would not have made, so that no key leaves the folder. */
export function checkPhotoKey(key: string): void {
  if (!keyPattern.test(key)) throw new RangeError(`Not a photo key: ${key}`)
}

/** Keeps pictures as files in a folder. A file appears whole or not at all: it is written beside and renamed. */
export function folderPhotoStorage(folder: string): PhotoStorage {
  const place = (key: string): string => {
    checkPhotoKey(key)
    return path.join(folder, key)
  }
  return {
    write: async (key, bytes) => {
      const target = place(key)
      await mkdir(path.dirname(target), { recursive: true })
      await writeWhole(target, bytes)
    },
    read: async (key) => {
      try {
        return await readFile(place(key))
      } catch (error) {
        if (isMissing(error)) return undefined
        throw error
      }
    },
    remove: async (key) => {
      const target = place(key)
      await rm(target, { force: true })
      // The photo's own folder goes with its last picture; while another is in it, this does nothing.
      await rmdir(path.dirname(target)).catch(() => undefined)
    },
  }
}

async function writeWhole(target: string, bytes: Uint8Array): Promise<void> {
  const beside = `${target}.${randomUUID()}.part`
  try {
    const file = await open(beside, 'wx')
    try {
      await file.writeFile(bytes)
      await file.sync()
    } finally {
      await file.close()
    }
    await rename(beside, target)
  } catch (error) {
    await rm(beside, { force: true })
    throw error
  }
}

const isMissing = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && error.code === 'ENOENT'
