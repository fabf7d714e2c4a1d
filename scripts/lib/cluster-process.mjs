import { readFileSync, readlinkSync, realpathSync } from 'node:fs'
import { createServer } from 'node:net'
import { join } from 'node:path'
import { namesIn } from './find-program.mjs'
import { run } from './run-command.mjs'

/** A port on loopback that was free a moment ago; the wanted one if it is. */
export async function freePort(wanted = 0) {
  const probe = createServer()
  const listening = (port) =>
    new Promise((resolve) => {
      probe.once('error', () => resolve(undefined))
      probe.listen(port, '127.0.0.1', () => resolve(probe.address().port))
    })
  const port = (await listening(wanted)) ?? (await listening(0))
  await new Promise((resolve) => probe.close(resolve))
  return port
}

/** What the running server notes in its folder: its process and its port. Undefined when there is no such note. */
export function readProcessNote(folder) {
  try {
    const lines = readFileSync(join(folder, 'postmaster.pid'), 'utf8').split('\n')
    return { pid: Number(lines[0]), port: Number(lines[3]) }
  } catch (error) {
    if (error.code === 'ENOENT') return undefined
    throw error
  }
}

/** A process that is there and more than a remnant nobody has collected. */
export function isAlive(pid) {
  // 0 would ask after our own group, -1 after everybody.
  if (!(pid > 0)) return false
  try {
    process.kill(pid, 0)
  } catch (error) {
    if (error.code !== 'EPERM') return false
  }
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8')
    return !/^[ZX]/.test(stat.slice(stat.lastIndexOf(')') + 2))
  } catch {
    return process.platform !== 'linux'
  }
}

/** PostgreSQL’s processes work in their cluster’s folder. Undefined where the system does not tell. */
export function processesIn(folder) {
  if (process.platform !== 'linux') return undefined
  const real = realpathSync(folder)
  return namesIn('/proc').filter((name) => {
    try {
      return /^\d+$/.test(name) && readlinkSync(`/proc/${name}/cwd`) === real
    } catch {
      return false
    }
  })
}

/** Whether a server answers on loopback. */
export async function answers(programs, port) {
  const args = ['-h', '127.0.0.1', '-p', String(port), '-t', '2']
  return (await run(join(programs, 'pg_isready'), args, { cwd: '/' })).status === 0
}
