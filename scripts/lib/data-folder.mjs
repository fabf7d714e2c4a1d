import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { isAlive } from './cluster-process.mjs'
import { diskFull, freeBytes, Trouble } from './trouble.mjs'

/** Room for a new database, and for one that is there to go on. */
const ROOM_BYTES = { making: 100 * 2 ** 20, keeping: 24 * 2 ** 20 }

/** Makes the data folder if need be and checks that it can be used. @throws Trouble */
export function openDataFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o711 })
    // Others pass through the data folder to the database; the pictures of customers' homes are none of their business.
    mkdirSync(join(folder, 'photos'), { recursive: true, mode: 0o700 })
    const probe = join(folder, `.probe-${process.pid}`)
    writeFileSync(probe, 'x')
    rmSync(probe)
  } catch (error) {
    if (error.code === 'ENOSPC' || error.code === 'EDQUOT') throw diskFull(folder)
    throw new Trouble(
      `The data folder ${folder} cannot be used (${error.code}): make it a folder this user may write, or name another with TAUTBOOK_DATA.`,
    )
  }
  const room = existsSync(join(folder, 'database.json')) ? ROOM_BYTES.keeping : ROOM_BYTES.making
  if (freeBytes(folder) < room) throw diskFull(folder)
}

/** Writes a small file whole or not at all, for its owner's eyes. */
export function writePrivately(file, text) {
  const beside = `${file}.${process.pid}.part`
  writeFileSync(beside, text, { mode: 0o600 })
  renameSync(beside, file)
}

/** The text of a file; undefined when it is not there. @throws Trouble when it cannot be read. */
export function readIfThere(file) {
  try {
    return readFileSync(file, 'utf8')
  } catch (error) {
    if (error.code === 'ENOENT') return undefined
    throw new Trouble(
      `${file} cannot be read (${error.code}): start as the user who owns it, or name another folder with TAUTBOOK_DATA.`,
    )
  }
}

/** The secret that signs session cookies: given, or made once and kept. */
export function sessionSecret(folder) {
  const file = join(folder, 'session-secret')
  const kept = readIfThere(file)?.trim()
  if (kept && kept.length >= 32) return kept
  const made = randomBytes(32).toString('base64url')
  writePrivately(file, `${made}\n`)
  return made
}

/** Whether a process is one of our own starts and not a stranger who got its number. */
function isOurs(pid) {
  if (!isAlive(pid)) return false
  try {
    return /scripts\/(start|dev)\.mjs/.test(readFileSync(`/proc/${pid}/cmdline`, 'utf8'))
  } catch {
    return true
  }
}

/**
 * Takes the folder for this process, so that no second start shares its cluster and has it stopped from under it.
 * Returns how to let go of it. @throws Trouble when another start holds it.
 */
export function holdDataFolder(folder) {
  const file = join(folder, 'running.pid')
  for (;;) {
    try {
      writeFileSync(file, `${process.pid}\n`, { flag: 'wx' })
      break
    } catch (error) {
      if (error.code !== 'EEXIST') throw error
    }
    const pid = Number(readIfThere(file))
    if (pid > 0 && isOurs(pid)) {
      throw new Trouble(
        `Tautbook already runs from ${folder} (process ${pid}): stop that one, or name another folder with TAUTBOOK_DATA.`,
      )
    }
    rmSync(file, { force: true })
  }
  return () => rmSync(file, { force: true })
}
