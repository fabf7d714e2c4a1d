import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { newestChange } from '../../scripts/lib/build.mjs'

const HOUR = 3600
let folder: string
const inFolder = (...names: string[]) => path.join(folder, ...names)
const age = (hour: number, ...names: string[]) => utimesSync(inFolder(...names), hour * HOUR, hour * HOUR)

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'tautbook-build-'))
  mkdirSync(inFolder('deep', 'er'), { recursive: true })
  for (const name of ['a.ts', 'deep/er/b.ts']) writeFileSync(inFolder(name), '')
  for (const name of ['a.ts', 'deep/er/b.ts', 'deep/er', 'deep', '']) age(1, name)
})
afterEach(() => rmSync(folder, { recursive: true }))

describe('newestChange', () => {
  it('finds the newest file however deep', () => {
    age(5, 'deep/er/b.ts')
    expect(newestChange(folder)).toBe(5 * HOUR * 1000)
  })

  it('notices a deletion, which leaves no newer file', () => {
    rmSync(inFolder('deep/er/b.ts'))
    expect(newestChange(folder)).toBeGreaterThan(HOUR * 1000)
  })

  it('is 0 for what is not there, so that an optional source never makes a build old', () => {
    expect(newestChange(inFolder('absent'))).toBe(0)
  })
})
