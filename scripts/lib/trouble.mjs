import { statfsSync } from 'node:fs'
import { dirname } from 'node:path'

/** A failure that somebody can mend: its message is the one sentence they get, without a stack. */
export class Trouble extends Error {
  constructor(sentence, { output = '' } = {}) {
    super(sentence)
    this.name = 'Trouble'
    /** What the program that failed said, for those who want to look closer. */
    this.output = output
  }
}

/** Somebody pressed Ctrl-C: nothing to explain. */
export class Stopped extends Error {}

const ENOUGH_BYTES = 8 * 2 ** 20

/** Free bytes on the disk that holds a path, which need not exist yet. */
export function freeBytes(path) {
  for (let at = path; ; at = dirname(at)) {
    try {
      const { bavail, bsize } = statfsSync(at)
      return bavail * bsize
    } catch (error) {
      if (error.code !== 'ENOENT' || at === dirname(at)) return Infinity
    }
  }
}

export const diskFull = (folder) =>
  new Trouble(`The disk that holds ${folder} is full: free about 500 MB there, then start again.`)

/** Explains a failed step: a full disk before all else, since it makes every program fail in its own words. */
export function troubleOf({ sentence, folder, output = '' }) {
  const full = /ENOSPC|No space left on device|Disk quota exceeded/.test(output)
  return full || freeBytes(folder) < ENOUGH_BYTES ? diskFull(folder) : new Trouble(sentence, { output })
}

const lastLines = (text, count = 30) => text.trimEnd().split('\n').slice(-count).join('\n')

/** Writes what is known of a failure to standard error, the sentence last, where it is read. */
export function report(error) {
  if (error instanceof Stopped) return
  if (error.code === 'ENOSPC' || error.code === 'EDQUOT') {
    process.stderr.write(`${diskFull(error.path ?? process.cwd()).message}\n`)
  } else if (error instanceof Trouble) {
    if (error.output.trim()) process.stderr.write(`${lastLines(error.output)}\n\n`)
    process.stderr.write(`${error.message}\n`)
  } else process.stderr.write(`${error.stack ?? error}\n`)
}
