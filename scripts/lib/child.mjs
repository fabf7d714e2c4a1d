import { spawn } from 'node:child_process'
import { root } from './root.mjs'
import { onStop } from './run-command.mjs'

const PATIENCE_MS = 10_000

/**
 * Runs a program in the foreground, its words going where ours go, until it ends or somebody wants to stop; then it is
 * told and waited for. A channel to it closes with this process, so it can tell when it has been left alone.
 */
export function runInForeground(program, args, env) {
  return new Promise((resolve) => {
    const child = spawn(program, args, { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit', 'ipc'] })
    let told = false
    let impatience
    const stop = () => {
      told = true
      child.kill('SIGTERM')
      impatience ??= setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS)
    }
    const takeBack = onStop(stop)
    const end = (result) => {
      clearTimeout(impatience)
      takeBack()
      resolve({ told, stop, ...result })
    }
    child.on('error', (error) => end({ status: null, signal: error.message }))
    child.on('exit', (status, signal) => end({ status, signal }))
  })
}
