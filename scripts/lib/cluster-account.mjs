import { spawnSync } from 'node:child_process'
import { chmodSync, readFileSync, statSync } from 'node:fs'
import { dirname } from 'node:path'
import { Trouble } from './trouble.mjs'

/**
 * As whom PostgreSQL runs: it refuses to run as root, so there it becomes the user its package made.
 * Returns what `spawn` wants; empty for ordinary users. @throws Trouble
 */
export function clusterAccount() {
  if (process.getuid?.() !== 0) return {}
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((each) => each.startsWith('postgres:'))
  if (!line) {
    throw new Trouble(
      'PostgreSQL does not run as root and there is no user postgres here: add one (useradd --system postgres) or start as an ordinary user.',
    )
  }
  const [, , uid, gid] = line.split(':')
  return { uid: Number(uid), gid: Number(gid) }
}

const maySearch = (account, folder) =>
  spawnSync('/bin/sh', ['-c', 'test -x "$1"', 'sh', folder], { ...account, cwd: '/' }).status === 0

/** The folder on the way to a place that keeps the account out, if any. The place itself must exist. */
export function blockingFolder(account, place) {
  if (account.uid === undefined) return undefined
  const way = []
  for (let at = place; ; at = dirname(at)) {
    way.unshift(at)
    if (at === dirname(at)) break
  }
  return way.find((folder) => !maySearch(account, folder))
}

/** Lets others pass through a folder of ours, without letting them list it. */
export function letPass(folder) {
  chmodSync(folder, statSync(folder).mode | 0o111)
}
