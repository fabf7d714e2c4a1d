import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { packagesAreCurrent } from '../../scripts/lib/packages.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'tautbook-packages-'))
  mkdirSync(path.join(folder, 'node_modules'))
})
afterEach(() => rmSync(folder, { recursive: true }))

type Packages = Record<string, { version: string; optional?: boolean }>

function write(name: string, packages: Packages, hour: number): void {
  const file = path.join(folder, name)
  writeFileSync(file, JSON.stringify({ packages }))
  utimesSync(file, hour * 3600, hour * 3600)
}

const lock = (packages: Packages, hour: number) => write('package-lock.json', packages, hour)
const installed = (packages: Packages, hour: number) =>
  write('node_modules/.package-lock.json', packages, hour)

const zod = { 'node_modules/zod': { version: '4.6.7' } }

describe('packagesAreCurrent', () => {
  it('is false before anything is installed', () => {
    lock(zod, 1)
    expect(packagesAreCurrent(folder)).toBe(false)
  })

  it('is true when the install came after the lock file', () => {
    lock(zod, 1)
    installed(zod, 2)
    expect(packagesAreCurrent(folder)).toBe(true)
  })

  it('is false when a newer lock file names another version', () => {
    lock({ 'node_modules/zod': { version: '4.6.8' } }, 3)
    installed(zod, 2)
    expect(packagesAreCurrent(folder)).toBe(false)
  })

  it('is true when a newer lock file names nothing new, except for other systems', () => {
    lock({ ...zod, 'node_modules/only-elsewhere': { version: '1.0.0', optional: true } }, 3)
    installed(zod, 2)
    expect(packagesAreCurrent(folder)).toBe(true)
  })
})
