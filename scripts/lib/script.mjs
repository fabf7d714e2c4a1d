import { watchSignals } from './run-command.mjs'
import { report, Stopped } from './trouble.mjs'

export const say = (text) => process.stdout.write(`${text}\n`)

/** Runs a script to its end: its exit code, or one sentence and 1. Ctrl-C ends it well. */
export async function runScript(work) {
  watchSignals()
  try {
    process.exitCode = (await work()) ?? 0
  } catch (error) {
    report(error)
    process.exitCode = error instanceof Stopped ? 0 : 1
  }
}
