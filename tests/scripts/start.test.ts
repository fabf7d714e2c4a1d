import { spawn, spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'

const script = path.resolve('scripts/start.mjs')
const folder = mkdtempSync(path.join(tmpdir(), 'tautbook-start-'))
afterAll(() => rmSync(folder, { recursive: true }))

interface Ended {
  status: number | null
  said: string
}

/** Runs `npm start` up to the trouble it must find before the long work; whatever goes on longer is a failure. */
function start(environment: Record<string, string>): Promise<Ended> {
  const env = {
    PATH: process.env['PATH'],
    HOME: folder,
    TAUTBOOK_DATA: path.join(folder, 'data'),
    ...environment,
  }
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [script], { env, timeout: 15_000 })
    let said = ''
    child.stderr.on('data', (chunk: Buffer) => (said += chunk.toString()))
    child.on('close', (status) => resolve({ status, said: said.trim() }))
  })
}

describe('npm start', () => {
  it('says which port is taken and what to do', async () => {
    const other = createServer().listen(0, '127.0.0.1')
    await new Promise((resolve) => other.once('listening', resolve))
    const { port } = other.address() as AddressInfo
    const { status, said } = await start({ PORT: String(port) })
    other.close()
    expect(said).toBe(
      `Another program already listens on 127.0.0.1:${port}: stop it, or choose another port, for example PORT=${port + 1}.`,
    )
    expect(status).toBe(1)
  })

  it.each([
    ['a port that is none', { PORT: '46oo' }, /^PORT is 46oo: give a whole number from 0 to 65535/],
    [
      'a database of another kind',
      { DATABASE_URL: 'mysql://u:secret@h/d' },
      /^DATABASE_URL must look like postgres:/,
    ],
  ])('refuses %s in one sentence', async (_what, environment, sentence) => {
    const { status, said } = await start(environment)
    expect(said).toMatch(sentence)
    expect(said).not.toContain('secret')
    expect(said.split('\n')).toHaveLength(1)
    expect(status).toBe(1)
  })

  it('is refused by an old Node before anything newer is read', () => {
    const pretend = path.join(folder, 'old.cjs')
    writeFileSync(pretend, "Object.defineProperty(process.versions, 'node', { value: '18.20.4' })\n")
    const { status, stderr } = spawnSync(process.execPath, ['-r', pretend, script], { encoding: 'utf8' })
    expect(stderr.trim()).toBe(
      'Tautbook needs Node 20.19 or newer; this is 18.20.4: install Node 20, then start again.',
    )
    expect(status).toBe(1)
  })
})
