import { createServer, type RequestListener, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'

export interface Listening {
  /** Where people open it. */
  address: string
  close: () => Promise<void>
}

/** Requests still running get this long to finish when the server closes. */
const PATIENCE_MS = 4_000

/** Listens until closed. @throws the system's error, `EADDRINUSE` for one. */
export async function listen(
  handler: RequestListener,
  at: { host: string; port: number },
): Promise<Listening> {
  const server = createServer(handler)
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(at.port, at.host, () => {
      server.off('error', reject)
      resolve()
    })
  })
  const { port } = server.address() as AddressInfo
  return { address: `http://${visibleHost(at.host)}:${port}`, close: () => close(server) }
}

/** A host that can be typed into a browser on this machine. */
const visibleHost = (host: string): string => {
  if (host === '0.0.0.0' || host === '::') return 'localhost'
  return host.includes(':') ? `[${host}]` : host
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const impatience = setTimeout(() => server.closeAllConnections(), PATIENCE_MS)
    server.close(() => {
      clearTimeout(impatience)
      resolve()
    })
    server.closeIdleConnections()
  })
}

const listenSentences: Record<string, (where: string) => string> = {
  EADDRINUSE: (where) =>
    `Another program already listens on ${where}: stop it, or choose another port, for example PORT=4601.`,
  EACCES: (where) => `This user may not listen on ${where}: choose a port above 1023, for example PORT=4600.`,
  EADDRNOTAVAIL: (where) =>
    `This machine has no address ${where}: correct HOST, for example 127.0.0.1 or 0.0.0.0.`,
  ENOTFOUND: (where) => `The host of ${where} is not known: correct HOST, for example 127.0.0.1 or 0.0.0.0.`,
}

/** One sentence for a server that could not listen; undefined for any other failure. */
export function explainListenFailure(error: unknown, at: { host: string; port: number }): string | undefined {
  if (!(error instanceof Error) || !('syscall' in error) || !('code' in error)) return undefined
  if (error.syscall !== 'listen' && error.syscall !== 'getaddrinfo') return undefined
  return listenSentences[String(error.code)]?.(`${at.host}:${at.port}`)
}
