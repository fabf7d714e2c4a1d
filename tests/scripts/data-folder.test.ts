import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { holdDataFolder, openDataFolder, sessionSecret } from '../../scripts/lib/data-folder.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'tautbook-data-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

describe('sessionSecret', () => {
  it('is made once, kept, and for its owner’s eyes alone', () => {
    const made = sessionSecret(folder)
    expect(made.length).toBeGreaterThanOrEqual(32)
    expect(sessionSecret(folder)).toBe(made)
    expect(statSync(path.join(folder, 'session-secret')).mode & 0o777).toBe(0o600)
  })

  it('is made anew where a crash left it empty', () => {
    writeFileSync(path.join(folder, 'session-secret'), '')
    expect(sessionSecret(folder).length).toBeGreaterThanOrEqual(32)
  })
})

describe('openDataFolder', () => {
  it('makes what is missing', () => {
    openDataFolder(path.join(folder, 'a', 'b'))
    expect(statSync(path.join(folder, 'a', 'b')).isDirectory()).toBe(true)
  })

  it('says what is wrong with a place that is no folder', () => {
    const file = path.join(folder, 'file')
    writeFileSync(file, '')
    expect(() => openDataFolder(file)).toThrow(
      `The data folder ${file} cannot be used (EEXIST): make it a folder this user may write, or name another with TAUTBOOK_DATA.`,
    )
  })
})

describe('holdDataFolder', () => {
  const note = () => path.join(folder, 'running.pid')

  it('is let go of again', () => {
    const letGo = holdDataFolder(folder)
    expect(readFileSync(note(), 'utf8').trim()).toBe(String(process.pid))
    letGo()
    expect(() => holdDataFolder(folder)()).not.toThrow()
  })

  it('takes over what a killed start left, and a number that now is a stranger’s', () => {
    for (const left of ['', '4194303', String(process.ppid)]) {
      writeFileSync(note(), left)
      expect(() => holdDataFolder(folder)()).not.toThrow()
    }
  })

  it('does not hide other failures', () => {
    mkdirSync(note())
    expect(() => holdDataFolder(folder)).toThrow(/cannot be read \(EISDIR\)/)
  })
})
