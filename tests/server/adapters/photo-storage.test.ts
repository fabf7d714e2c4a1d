import { randomUUID } from 'node:crypto'
import { mkdtemp, readdir, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { folderPhotoStorage, photoKey } from '../../../server/adapters/photo-storage'

let folder: string
beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'tautbook-photos-'))
})
afterEach(() => rm(folder, { recursive: true, force: true }))

const company = randomUUID()

describe('folderPhotoStorage', () => {
  it('gives back what was written and leaves nothing beside it', async () => {
    const storage = folderPhotoStorage(folder)
    const key = photoKey(company, randomUUID(), 'picture')
    await storage.write(key, Buffer.from('bytes'))
    expect((await storage.read(key))?.toString()).toBe('bytes')
    const files = await readdir(folder, { recursive: true, withFileTypes: true })
    expect(files.filter((entry) => entry.isFile()).map(({ name }) => name)).toEqual(['picture.jpg'])
  })

  it('removes, and does not mind what is not there', async () => {
    const storage = folderPhotoStorage(folder)
    const key = photoKey(company, randomUUID(), 'thumbnail')
    await storage.write(key, Buffer.from('bytes'))
    await storage.remove(key)
    await storage.remove(key)
    expect(await storage.read(key)).toBeUndefined()
    expect(await readdir(path.join(folder, company))).toEqual([])
  })

  it.each(['../outside.jpg', `${company}/../x/picture.jpg`, '/etc/passwd', `${company}/picture.jpg`])(
    'takes no key like %s',
    async (key) => {
      const storage = folderPhotoStorage(folder)
      await expect(storage.read(key)).rejects.toThrow(RangeError)
      await expect(storage.write(key, Buffer.from('x'))).rejects.toThrow(RangeError)
    },
  )
})
