import { Socket } from 'node:net'
import { afterAll, afterEach, beforeEach } from 'vitest'

/**
 * What a test must not do unnoticed: reach for the network beyond this machine, or write to `console.error`. Either
 * fails the test even if the code under test swallows it. A test that means it replaces `console.error` by a spy.
 */
const LOOPBACK = new Set(['127.0.0.1', '::1', 'localhost'])
const noticed: string[] = []

interface Target {
  host?: string
  path?: string
}

/** `connect` is called as (options), (port, host), (path), or by Node itself with such arguments in an array. */
function targetOf(args: unknown[]): Target {
  const [first, second] = (Array.isArray(args[0]) ? args[0] : args) as unknown[]
  if (typeof first === 'object' && first !== null) return first
  if (typeof first === 'number') return { host: typeof second === 'string' ? second : undefined }
  return { path: String(first) }
}

// eslint-disable-next-line @typescript-eslint/unbound-method -- called below with its own `this`
const connect = Socket.prototype.connect as (this: Socket, ...args: unknown[]) => Socket

Socket.prototype.connect = function guarded(this: Socket, ...args: unknown[]): Socket {
  const { host = 'localhost', path } = targetOf(args)
  if (path !== undefined || LOOPBACK.has(host)) return connect.apply(this, args)
  noticed.push(`reached for the network: ${host}`)
  // Destroyed, so that the caller sees a failed connection as it would for a host that is not there.
  process.nextTick(() => this.destroy(new Error(`Tests may not reach for the network: ${host}`)))
  return this
}

const original = console.error
console.error = (...words: unknown[]) => {
  noticed.push(`console.error: ${words.map(String).join(' ')}`)
  original(...words)
}

function failIfNoticed(): void {
  const all = noticed.splice(0)
  if (all.length > 0) throw new Error(`Not allowed in a test:\n${all.join('\n')}`)
}

beforeEach(failIfNoticed)
afterEach(failIfNoticed)
afterAll(failIfNoticed)
