import { chmodSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer, type Server } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import postgres from 'postgres'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { openKeptCluster } from '../../../scripts/lib/kept-cluster.mjs'

// It stands here and not beside the other tests of scripts because it needs a real PostgreSQL.
const dataFolder = mkdtempSync(path.join(tmpdir(), 'tautbook-kept-'))
const folder = path.join(dataFolder, 'database')
const open = () => openKeptCluster({ dataFolder, dataChosen: true, say: () => undefined })
const note = (line: number) =>
  readFileSync(path.join(folder, 'postmaster.pid'), 'utf8').split('\n')[line] ?? ''

async function ask<Row>(url: string, statement: string): Promise<Row[]> {
  const sql = postgres(url, { max: 1 })
  try {
    return await sql.unsafe<Row[]>(statement)
  } finally {
    await sql.end()
  }
}

const takePort = (port: number): Promise<Server> =>
  new Promise((resolve, reject) => {
    const server = createServer().once('error', reject)
    server.listen(port, '127.0.0.1', () => resolve(server))
  })

let cluster: Awaited<ReturnType<typeof open>>
beforeAll(async () => {
  // What a start killed in the middle of the making leaves.
  mkdirSync(`${folder}.making-1`)
  writeFileSync(path.join(`${folder}.making-1`, 'PG_VERSION'), '15\n')
  cluster = await open()
  await ask(cluster.url, 'create table kept as select 7 as figure')
})
afterEach(async () => {
  expect(await ask(cluster.url, 'select figure from kept')).toEqual([{ figure: 7 }])
})
afterAll(async () => {
  await cluster.stop()
  rmSync(dataFolder, { recursive: true })
})

describe('openKeptCluster', () => {
  it('clears away what was left half made', () => {
    expect(existsSync(`${folder}.making-1`)).toBe(false)
  })

  it('keeps its data over a stop, and stops cleanly', async () => {
    await cluster.stop()
    expect(existsSync(path.join(folder, 'postmaster.pid'))).toBe(false)
    cluster = await open()
  })

  it('uses a server again that a killed start left running', async () => {
    const before = note(0)
    cluster = await open()
    expect(note(0)).toBe(before)
  })

  it('starts again after the server was killed', async () => {
    const before = note(0)
    process.kill(Number(before), 'SIGKILL')
    cluster = await open()
    expect(note(0)).not.toBe(before)
  })

  it('notices that its server was killed and starts it again at the same address', async () => {
    expect(cluster.isGone()).toBe(false)
    process.kill(Number(note(0)), 'SIGKILL')
    await expect.poll(() => cluster.isGone()).toBe(true)
    expect(String(await cluster.startAgain())).toBe(new URL(cluster.url).port)
    expect(cluster.isGone()).toBe(false)
  })

  it('is not misled by a note that names a stranger’s process', async () => {
    await cluster.stop()
    writeFileSync(path.join(folder, 'postmaster.pid'), `${process.pid}\n${folder}\n1\n1\n\n127.0.0.1\n`)
    chmodSync(path.join(folder, 'postmaster.pid'), 0o644)
    cluster = await open()
    expect(note(0)).not.toBe(String(process.pid))
  })

  it('moves to another port when its own is taken', async () => {
    await cluster.stop()
    const noteFile = path.join(dataFolder, 'database.json')
    const kept = JSON.parse(readFileSync(noteFile, 'utf8')) as { port: number }
    const taken = await takePort(kept.port)
    cluster = await open()
    taken.close()
    expect(new URL(cluster.url).port).not.toBe(String(kept.port))
  })
})

describe('openKeptCluster, of a damaged folder', () => {
  it('says what is missing and leaves it as it is', async () => {
    const damaged = mkdtempSync(path.join(tmpdir(), 'tautbook-damaged-'))
    mkdirSync(path.join(damaged, 'database', 'base'), { recursive: true })
    writeFileSync(path.join(damaged, 'database', 'PG_VERSION'), '15\n')
    await expect(
      openKeptCluster({ dataFolder: damaged, dataChosen: true, say: () => undefined }),
    ).rejects.toThrow(
      `The database in ${path.join(damaged, 'database')} is not whole (global/pg_control is missing): restore it from a copy, or move the folder away to begin anew.`,
    )
    expect(existsSync(path.join(damaged, 'database', 'base'))).toBe(true)
    rmSync(damaged, { recursive: true })
  })
})
