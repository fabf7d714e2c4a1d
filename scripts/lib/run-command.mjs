import { spawn } from 'node:child_process'
import { Stopped } from './trouble.mjs'

const running = new Set()
const wishes = new Set()
let told = false

/** Ends everything, as if somebody had pressed Ctrl-C. */
export function stopAll() {
  told = true
  for (const child of running) child.kill('SIGTERM')
  for (const wish of wishes) wish()
}

/** From now on Ctrl-C and its like end the programs we started and run what was left with `onStop`, then nothing else. */
export function watchSignals() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, stopAll)
  if (process.env.npm_lifecycle_event) stopWithParent()
}

/** When the program that started this one is killed nobody is told: this process merely gets another parent. */
export function stopWithParent() {
  const parent = process.ppid
  setInterval(() => {
    if (process.ppid !== parent && !told) stopAll()
  }, 500).unref()
}

/** Calls back when somebody wants to stop; returns how to take that back. */
export function onStop(wish) {
  wishes.add(wish)
  if (told) wish()
  return () => wishes.delete(wish)
}

/** @throws Stopped once somebody wants to stop, so that no further step begins. */
export function goOn() {
  if (told) throw new Stopped()
}

/**
 * Runs a program to its end and keeps what it says; `status` is null when it could not be started or was killed.
 * With `show` its words also go to standard error as they come.
 */
export function run(program, args, { show = false, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, { stdio: ['ignore', 'pipe', 'pipe'], ...options })
    let output = ''
    const hear = (chunk) => {
      output += chunk
      if (show) process.stderr.write(chunk)
    }
    running.add(child)
    child.stdout.on('data', hear)
    child.stderr.on('data', hear)
    const end = (status) => {
      running.delete(child)
      child.stdout.destroy()
      child.stderr.destroy()
      resolve({ status, output })
    }
    child.on('close', end)
    // A server left behind by the program may hold its output open for ever.
    child.on('exit', (status) => setTimeout(end, 500, status))
    child.on('error', (error) => {
      running.delete(child)
      resolve({ status: null, output: `${output}${error.message}\n` })
    })
  })
}

export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms))
