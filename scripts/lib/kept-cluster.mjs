import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs'
import { basename, dirname, join } from 'node:path'
import { blockingFolder, clusterAccount, letPass } from './cluster-account.mjs'
import { isAlive, readProcessNote } from './cluster-process.mjs'
import { DATABASE, makeCluster, newPassword, query, startCluster, stopCluster, urlOf } from './cluster.mjs'
import { readIfThere, writePrivately } from './data-folder.mjs'
import { namesIn } from './find-program.mjs'
import { requirePostgres } from './postgres-programs.mjs'
import { goOn } from './run-command.mjs'
import { root } from './root.mjs'
import { Trouble, troubleOf } from './trouble.mjs'

/**
 * What is noted beside the cluster, for its owner's eyes: its password, its port, whether its database was made, and
 * where it lies if not in the data folder (a data folder copied elsewhere must not lead back to the first).
 */
const noteFile = (dataFolder) => join(dataFolder, 'database.json')

function readNote(dataFolder) {
  const text = readIfThere(noteFile(dataFolder))
  if (text === undefined) return undefined
  try {
    return JSON.parse(text)
  } catch {
    throw new Trouble(
      `${noteFile(dataFolder)} is damaged: restore it, or move ${dataFolder} away to begin anew.`,
    )
  }
}

const writeNote = (dataFolder, note) =>
  writePrivately(noteFile(dataFolder), `${JSON.stringify(note, null, 2)}\n`)

/** A place that the user postgres reaches on any Debian, told apart by where the program lies. */
const otherPlace = () => `/var/lib/tautbook/${createHash('sha256').update(root).digest('hex').slice(0, 12)}`

/**
 * The folder for a new cluster: in the data folder, unless the account that PostgreSQL runs as cannot get there. Then a
 * folder that somebody chose is refused and the usual one gives way to a place named. @throws Trouble
 */
function placeFor({ account, dataFolder, dataChosen, say }) {
  if (account.uid !== undefined) letPass(dataFolder)
  const blocking = blockingFolder(account, dataFolder)
  if (blocking === undefined) return join(dataFolder, 'database')
  const other = otherPlace()
  const what = `The user postgres, as whom PostgreSQL runs, cannot pass through ${blocking} to ${dataFolder}`
  if (dataChosen)
    throw new Trouble(
      `${what}: allow it (chmod o+x ${blocking}), or name another folder, for example TAUTBOOK_DATA=${other}.`,
    )
  mkdirSync(other, { recursive: true, mode: 0o711 })
  say(`${what}, so the database is kept in ${other}; TAUTBOOK_DATA names another place.`)
  return join(other, 'database')
}

/** What starts that were killed left half made. */
function sweep(folder) {
  for (const name of namesIn(dirname(folder))) {
    if (name.startsWith(`${basename(folder)}.making-`))
      rmSync(join(dirname(folder), name), { recursive: true, force: true })
  }
}

async function makeWhole({ programs, account, folder, dataFolder }) {
  const making = `${folder}.making-${process.pid}`
  const elsewhere = dirname(folder) === dataFolder ? undefined : folder
  const note = { elsewhere, password: newPassword(), port: 0, databaseMade: false }
  await makeCluster({ programs, account, folder: making, password: note.password })
  goOn()
  writeNote(dataFolder, note)
  // Only a whole cluster ever bears the name.
  renameSync(making, folder)
  return note
}

/** A folder that bears the name but lacks what every cluster has was damaged by something else than us. @throws Trouble */
function checkWhole(folder) {
  const missing = ['PG_VERSION', 'global/pg_control', 'base', 'pg_wal'].find(
    (name) => !existsSync(join(folder, name)),
  )
  if (missing)
    throw new Trouble(
      `The database in ${folder} is not whole (${missing} is missing): restore it from a copy, or move the folder away to begin anew.`,
    )
}

async function makeDatabase({ programs, port, password, folder }) {
  const there = await query({
    programs,
    port,
    password,
    sql: `select 1 from pg_database where datname = '${DATABASE}'`,
  })
  if (there.status === 0 && there.output.trim() === '1') return
  const made =
    there.status === 0 ? await query({ programs, port, password, sql: `create database ${DATABASE}` }) : there
  if (made.status !== 0)
    throw troubleOf({
      sentence: `The database could not be made in ${folder}: see above.`,
      folder,
      output: made.output,
    })
}

/** Finds or makes the cluster of a data folder and starts it; returns its address and how to stop it. @throws Trouble */
export async function openKeptCluster({ dataFolder, dataChosen, say }) {
  let note = readNote(dataFolder)
  const usual = join(dataFolder, 'database')
  const existing = [note?.elsewhere, usual].find((folder) => folder && namesIn(folder).length > 0)
  if (existing) checkWhole(existing)
  if (existing && !note)
    throw new Trouble(
      `${noteFile(dataFolder)}, which holds the password of the database beside it, is missing: restore it, or move ${existing} away to begin anew.`,
    )
  const major = existing ? Number(readIfThere(join(existing, 'PG_VERSION'))) : undefined
  const programs = await requirePostgres({ say, major })
  const account = clusterAccount()
  const folder = existing ?? placeFor({ account, dataFolder, dataChosen, say })
  sweep(folder)
  if (!existing) {
    say('Making the database …')
    note = await makeWhole({ programs, account, folder, dataFolder })
  }
  checkReach({ account, folder })
  const cluster = { programs, account, folder }
  const port = await startCluster({ ...cluster, port: note.port })
  try {
    if (!note.databaseMade) await makeDatabase({ ...cluster, port, password: note.password })
    if (!note.databaseMade || note.port !== port) writeNote(dataFolder, { ...note, port, databaseMade: true })
  } catch (error) {
    await stopCluster(cluster)
    throw error
  }
  return {
    url: urlOf({ port, password: note.password }),
    stop: () => stopCluster(cluster),
    isGone: () => !isAlive(readProcessNote(folder)?.pid ?? 0),
    startAgain: () => startCluster({ ...cluster, port }),
  }
}

function checkReach({ account, folder }) {
  const blocking = blockingFolder(account, folder)
  if (blocking)
    throw new Trouble(
      `The user postgres, as whom PostgreSQL runs, cannot pass through ${blocking} to the database in ${folder}: allow it (chmod o+x ${blocking}).`,
    )
}
